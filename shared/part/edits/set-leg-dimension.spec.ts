import type { PartDocument } from '../document';
import { setLegDimension } from './set-leg-dimension';

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

describe('setting a leg dimension', () => {
  it('keeps what was typed and everything else of the leg', () => {
    expect(setLegDimension(angle, 0, '1 3/16').chain[0]).toEqual({ id: 'a', leg: '1 3/16', name: 'Foot' });
    expect(setLegDimension(angle, 0, 'no figure').chain[0]).toEqual({ id: 'a', leg: 'no figure', name: 'Foot' });
  });

  it('changes nothing at a bend or when the dimension stands already', () => {
    expect(setLegDimension(angle, 1, 3)).toBe(angle);
    expect(setLegDimension(angle, 0, 1)).toBe(angle);
  });
});
