import type { PartDocument } from '../document';
import { setGrain, setMaterial, setThickness, setWidth } from './set-sheet';

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

describe('setting the sheet', () => {
  it('changes thickness, width, material and grain', () => {
    expect(setThickness(angle, '0.05').thickness).toBe('0.05');
    expect(setWidth(angle, 6).width).toBe(6);
    expect(setMaterial(angle, '2024-T3').material).toBe('2024-T3');
    expect(setGrain(angle, 'across').grain).toBe('across');
  });

  it('takes away what is not decided', () => {
    expect(setWidth(setWidth(angle, 6), undefined)).toEqual(angle);
    expect(setMaterial(setMaterial(angle, '2024-T3'), undefined)).toEqual(angle);
    expect(setGrain(setGrain(angle, 'along'), undefined)).toEqual(angle);
  });

  it('gives the same document back when nothing changes', () => {
    expect(setThickness(angle, 0.04)).toBe(angle);
    expect(setWidth(angle, undefined)).toBe(angle);
    expect(setMaterial(angle, undefined)).toBe(angle);
    expect(setGrain(angle, undefined)).toBe(angle);
  });
});
