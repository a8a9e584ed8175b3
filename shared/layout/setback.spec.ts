import { halfTangent, setback } from './setback';

const R = 0.125;
const T = 0.04;

describe('Setback', () => {
  it('at 90° is R + T to the outside, R to the inside, nothing to the tangent line', () => {
    expect(setback('mold-line', 90, R, T)).toBe(R + T);
    expect(setback('outside-edge', 90, R, T)).toBe(R + T);
    expect(setback('inside', 90, R, T)).toBe(R);
    expect(setback('flat', 90, R, T)).toBe(0);
  });

  it('below 90° is by the tangent of half the angle, for both outside measures', () => {
    const expected = (R + T) * Math.tan(Math.PI / 8);
    expect(setback('mold-line', 45, R, T)).toBeCloseTo(expected, 15);
    expect(setback('outside-edge', 45, R, T)).toBeCloseTo(expected, 15);
    expect(setback('inside', 45, R, T)).toBeCloseTo(R * Math.tan(Math.PI / 8), 15);
  });

  it('above 90° stays R + T by calipers, without a jump at 90°, and runs away to the mold point', () => {
    expect(setback('outside-edge', 90.000001, R, T)).toBe(R + T);
    expect(setback('outside-edge', 89.999999, R, T)).toBeCloseTo(R + T, 8);
    expect(setback('outside-edge', 135, R, T)).toBe(R + T);
    expect(setback('outside-edge', 180, R, T)).toBe(R + T);
    expect(setback('mold-line', 135, R, T)).toBeCloseTo((R + T) * (1 + Math.SQRT2), 12);
    expect(setback('mold-line', 179, R, T)!).toBeGreaterThan(100 * (R + T));
  });

  it('at 180° has no mold point, and a hair below it still has one', () => {
    expect(setback('mold-line', 180, R, T)).toBeNull();
    expect(setback('inside', 180, R, T)).toBeNull();
    expect(setback('flat', 180, R, T)).toBe(0);
    expect(setback('mold-line', 180 - 1e-6, R, T)).toBeGreaterThan(1e6);
  });

  it('of a sharp bend leaves the thickness outside and nothing inside', () => {
    expect(setback('mold-line', 90, 0, T)).toBe(T);
    expect(setback('inside', 90, 0, T)).toBe(0);
  });

  it('K of the chart is exactly 1 at 90°', () => {
    expect(halfTangent(90)).toBe(1);
    expect(halfTangent(60)).toBeCloseTo(1 / Math.sqrt(3), 15);
  });
});
