import type { PartDocument } from '../document';
import { setJoggle } from './set-joggle';

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

describe('setting a joggle', () => {
  it('changes depth and run apart', () => {
    expect(setJoggle(angle, 3, 'joggle', '1/16').chain[3]).toEqual({ ...angle.chain[3]!, joggle: '1/16' });
    expect(setJoggle(angle, 3, 'run', 0.5).chain[3]).toEqual({ ...angle.chain[3]!, run: 0.5 });
  });

  it('changes nothing at a leg or a bend', () => {
    expect(setJoggle(angle, 0, 'joggle', 1)).toBe(angle);
    expect(setJoggle(angle, 1, 'run', 1)).toBe(angle);
  });
});
