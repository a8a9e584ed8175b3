import type { PartDocument } from '../document';
import { setMeasure } from './set-measure';

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

describe('setting the measure of a leg', () => {
  it('writes one word when both ends agree and two when they differ', () => {
    expect(setMeasure(angle, 0, 'flat').chain[0]).toEqual({ id: 'a', leg: 1, name: 'Foot', measure: 'flat' });
    expect(setMeasure(angle, 0, ['flat', 'inside']).chain[0]).toEqual({
      id: 'a',
      leg: 1,
      name: 'Foot',
      measure: ['flat', 'inside'],
    });
    expect(setMeasure(angle, 0, ['flat', 'flat']).chain[0]).toEqual({ id: 'a', leg: 1, name: 'Foot', measure: 'flat' });
  });

  it('does not write down the mold line, which is assumed anyway', () => {
    expect(setMeasure(angle, 2, 'mold-line').chain[2]).toEqual({ id: 'c', leg: 2 });
    expect(setMeasure(angle, 0, 'mold-line')).toBe(angle);
  });

  it('changes nothing when the measure stands already, or at a bend', () => {
    expect(setMeasure(angle, 2, 'inside')).toBe(angle);
    expect(setMeasure(angle, 1, 'inside')).toBe(angle);
  });
});
