import type { PartDocument } from '../document';
import { setRadius } from './set-radius';

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

describe('setting the radius', () => {
  it('serves bends and joggles', () => {
    expect(setRadius(angle, 1, '5/32').chain[1]).toEqual({ id: 'b', bend: 90, turn: 'up', radius: '5/32' });
    expect(setRadius(angle, 3, 0.2).chain[3]).toEqual({ ...angle.chain[3]!, radius: 0.2 });
  });

  it('changes nothing at a leg', () => {
    expect(setRadius(angle, 0, 0.2)).toBe(angle);
  });
});
