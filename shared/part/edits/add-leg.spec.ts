import type { PartDocument } from '../document';
import { addLegAfter, addLegAtStart } from './add-leg';

const angle: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  allowance: { method: 'handbook' },
  chain: [
    { id: 'a', leg: 1, name: 'Foot' },
    { id: 'b', bend: 90, turn: 'up', radius: 0.16 },
    { id: 'c', leg: 2, measure: 'inside' },
    { id: 'd', joggle: 0.04, run: 0.3, turn: 'up', radius: 0.1 },
    { id: 'e', leg: '1 1/8' },
  ],
};

describe('adding a leg', () => {
  it('lengthens the chain behind the last leg, with the nearest radius', () => {
    const edited = addLegAfter(angle, 4);
    expect(edited.chain.slice(5)).toEqual([
      { bend: 90, turn: 'up', radius: 0.1, id: 'e1' },
      { leg: 1, id: 'e2' },
    ]);
    expect(edited.chain.slice(0, 5)).toEqual([...angle.chain]);
  });

  it('puts a leg between two', () => {
    const edited = addLegAfter(angle, 0);
    expect(edited.chain.map((entry) => entry.id)).toEqual(['a', 'e1', 'e2', 'b', 'c', 'd', 'e']);
  });

  it('puts a leg before the first', () => {
    const edited = addLegAtStart(angle);
    expect(edited.chain.map((entry) => entry.id)).toEqual(['e1', 'e2', 'a', 'b', 'c', 'd', 'e']);
    expect(edited.chain[0]).toEqual({ leg: 1, id: 'e1' });
  });

  it('keeps holes and seat on their legs', () => {
    const seated: PartDocument = {
      ...angle,
      seat: 1,
      holes: [{ leg: 0, diameter: 0.1, from: 'start', at: 0.5, across: 1 }],
    };
    expect(addLegAtStart(seated).seat).toBe(2);
    expect(addLegAtStart(seated).holes?.[0]?.leg).toBe(1);
    expect(addLegAfter(seated, 0).seat).toBe(2);
    expect(addLegAfter(seated, 0).holes?.[0]?.leg).toBe(0);
    expect(addLegAfter(seated, 4).seat).toBe(1);
  });

  it('starts a flat strip with a radius of its unit', () => {
    const strip: PartDocument = { ...angle, chain: [{ leg: 40 }] };
    expect(addLegAfter(strip, 0).chain).toEqual([{ leg: 40 }, { bend: 90, turn: 'up', radius: '1/8' }, { leg: 1 }]);
    expect(addLegAfter({ ...strip, unit: 'mm' }, 0).chain[1]).toEqual({ bend: 90, turn: 'up', radius: 3 });
  });

  it('changes nothing behind a bend', () => {
    expect(addLegAfter(angle, 1)).toBe(angle);
    expect(addLegAfter(angle, 9)).toBe(angle);
  });
});
