import type { PartDocument } from '../document';
import { setTurn } from './set-turn';

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

describe('setting the turn', () => {
  it('turns bends and joggles', () => {
    expect(setTurn(angle, 1, 'down').chain[1]).toEqual({ id: 'b', bend: 90, turn: 'down', radius: 0.16 });
    expect(setTurn(angle, 3, 'down').chain[3]).toEqual({ ...angle.chain[3]!, turn: 'down' });
  });

  it('changes nothing at a leg or when it stands already', () => {
    expect(setTurn(angle, 0, 'down')).toBe(angle);
    expect(setTurn(angle, 1, 'up')).toBe(angle);
  });
});
