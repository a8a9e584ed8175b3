import type { PartDocument } from '../document';
import { setName } from './set-name';

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

describe('setting a name', () => {
  it('names a leg, a bend and a joggle', () => {
    expect(setName(angle, 0, 'Left foot').chain[0]?.name).toBe('Left foot');
    expect(setName(angle, 1, 'Heel').chain[1]?.name).toBe('Heel');
    expect(setName(angle, 3, 'Step').chain[3]?.name).toBe('Step');
  });

  it('takes the name away when it is empty', () => {
    expect(setName(angle, 0, '').chain[0]).toEqual({ id: 'a', leg: 1 });
    expect(setName(angle, 2, '')).toBe(angle);
  });
});
