import { direction } from './direction';
import { areParallel, exceeds, fallsShort, isReturnBend, isRounding } from './tolerance';

describe('Comparisons that allow for rounding', () => {
  it('a return bend is 180°, or within a billionth of a degree of it', () => {
    expect([180, 180 - 1e-10].every(isReturnBend)).toBeTrue();
    expect([180 - 1e-8, 179].some(isReturnBend)).toBeFalse();
  });

  it('exceeds and falls short by more than the last bits', () => {
    expect(exceeds(0.1 + 0.2, 0.3)).toBeFalse();
    expect(exceeds(0.300001, 0.3)).toBeTrue();
    expect(fallsShort(3 * 0.04, 0.12)).toBeFalse();
    expect(fallsShort(0.1 * 3 - 1e-16, 0.3)).toBeFalse();
    expect(fallsShort(0.119999, 0.12)).toBeTrue();
    expect(exceeds(1e9 + 1e-4, 1e9)).toBeFalse();
  });

  it('what cancels to a last bit is rounding', () => {
    expect(isRounding(0.9 - 0.6 - 0.3, 0.9)).toBeTrue();
    expect(isRounding(0, 1)).toBeTrue();
    expect(isRounding(1e-9, 1)).toBeFalse();
    expect(isRounding(-1e-9, 1)).toBeFalse();
  });

  it('directions are parallel either way round, across the turn too', () => {
    expect(areParallel(90, 270)).toBeTrue();
    expect(areParallel(0, 360)).toBeTrue();
    expect(areParallel(-1e-12, 180)).toBeTrue();
    expect(areParallel(0, 1e-8)).toBeFalse();
    expect(areParallel(45, 135)).toBeFalse();
  });
});

describe('A direction', () => {
  it('is exact at every quarter turn, forwards and backwards', () => {
    for (const turns of [0, 360, -360, 720]) {
      expect(direction(turns)).toEqual({ x: 1, y: 0 });
      expect(direction(turns + 90)).toEqual({ x: 0, y: 1 });
      expect(direction(turns + 180)).toEqual({ x: -1, y: 0 });
      expect(direction(turns - 90)).toEqual({ x: 0, y: -1 });
    }
    expect(direction(30).x).toBeCloseTo(Math.sqrt(3) / 2, 15);
  });
});
