import type { PartDocument } from '../document';
import { setAllowance } from './set-allowance';

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

describe('setting the allowance method', () => {
  it('changes the method of the part and leaves the chain alone', () => {
    const edited = setAllowance(angle, { method: 'k-factor', k: 0.44 });
    expect(edited.allowance).toEqual({ method: 'k-factor', k: 0.44 });
    expect(edited.chain).toBe(angle.chain);
  });
});
