import type { PartDocument } from '../document';
import { setBendAngle } from './set-bend-angle';

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

describe('setting a bend angle', () => {
  it('keeps turn and radius', () => {
    expect(setBendAngle(angle, 1, 45).chain[1]).toEqual({ id: 'b', bend: 45, turn: 'up', radius: 0.16 });
  });

  it('changes nothing at a leg or a joggle', () => {
    expect(setBendAngle(angle, 0, 45)).toBe(angle);
    expect(setBendAngle(angle, 3, 45)).toBe(angle);
  });
});
