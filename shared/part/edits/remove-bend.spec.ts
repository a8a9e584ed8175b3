import type { PartDocument } from '../document';
import { removeBend, whyBendStays } from './remove-bend';

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

describe('removing a bend', () => {
  it('joins its legs and adds their dimensions as typed', () => {
    const edited = removeBend(angle, 3);
    expect(edited.chain.length).toBe(3);
    expect(edited.chain[2]).toEqual({ id: 'c', leg: '2 + 1 1/8', measure: ['inside', 'mold-line'] });
  });

  it('adds figures without binary dust', () => {
    const tenths: PartDocument = {
      ...angle,
      chain: [{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.1 }, { leg: 0.2 }],
    };
    expect(removeBend(tenths, 1).chain).toEqual([{ leg: 0.3 }]);
  });

  it('keeps the first name, else the second', () => {
    expect(removeBend(angle, 1).chain[0]?.name).toBe('Foot');
  });

  it('keeps holes and seat on their legs', () => {
    const seated: PartDocument = {
      ...angle,
      seat: 2,
      holes: [{ leg: 2, diameter: 0.1, from: 'start', at: 0.5, across: 1 }],
    };
    expect(removeBend(seated, 1).seat).toBe(1);
    expect(removeBend(seated, 1).holes?.[0]?.leg).toBe(1);
  });

  it('stays when a hole is dimensioned from a leg that would be joined', () => {
    const holed: PartDocument = {
      ...angle,
      holes: [{ leg: 1, diameter: 0.1, from: 'end', at: 0.5, across: 1 }],
    };
    expect(whyBendStays(holed, 1)).toContain('hole');
    expect(whyBendStays(holed, 3)).toContain('hole');
    expect(removeBend(holed, 1)).toBe(holed);
    expect(whyBendStays(angle, 1)).toBeNull();
  });

  it('leaves legs alone', () => {
    expect(removeBend(angle, 0)).toBe(angle);
    expect(removeBend(angle, 7)).toBe(angle);
  });
});
