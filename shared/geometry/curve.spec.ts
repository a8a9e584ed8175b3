import { randomFrom, SEED } from '../../tests/support/seed';
import type { XY } from '../result';
import { type Arc, arcPoint, covers, type Curve, distance, ends, segment } from './curve';

const arc = (centre: XY, radius: number, from: number, sweep: number): Arc => ({
  kind: 'arc',
  centre,
  radius,
  from,
  sweep,
});

const STEPS = 400;
function sampled(curve: Curve): XY[] {
  return Array.from({ length: STEPS + 1 }, (_, i): XY => {
    const t = i / STEPS;
    if (curve.kind === 'arc') return arcPoint(curve, curve.from + t * curve.sweep);
    const { from, to } = curve;
    return [from[0] + t * (to[0] - from[0]), from[1] + t * (to[1] - from[1])];
  });
}

const lengthOf = (curve: Curve): number =>
  curve.kind === 'arc'
    ? (Math.abs(curve.sweep) * Math.PI * curve.radius) / 180
    : Math.hypot(curve.to[0] - curve.from[0], curve.to[1] - curve.from[1]);

describe('The distance of two curves', () => {
  it('of segments: apart, crossing, touching, parallel, on one line', () => {
    const base = segment([0, 0], [1, 0]);
    expect(distance(base, segment([0, 2], [1, 2]))).toBe(2);
    expect(distance(base, segment([0.5, -1], [0.5, 1]))).toBe(0);
    expect(distance(base, segment([1, 0], [2, 3]))).toBe(0);
    expect(distance(base, segment([0.5, 1], [0.5, 0]))).toBe(0);
    expect(distance(base, segment([3, 0], [4, 0]))).toBe(2);
    expect(distance(base, segment([0.5, 0], [4, 0]))).toBe(0);
    expect(distance(base, segment([2, 1], [2, 1]))).toBeCloseTo(Math.SQRT2, 15);
  });

  it('of a segment and an arc: inside, outside, tangent, through, past its ends', () => {
    const upper = arc([0, 0], 1, 0, 180);
    expect(distance(segment([-0.5, 0.1], [0.5, 0.1]), upper)).toBeCloseTo(1 - Math.hypot(0.5, 0.1), 12);
    expect(distance(segment([-2, 1.5], [2, 1.5]), upper)).toBeCloseTo(0.5, 12);
    expect(distance(segment([-2, 1], [2, 1]), upper)).toBeCloseTo(0, 9);
    expect(distance(segment([0, 0], [0, 3]), upper)).toBe(0);
    expect(distance(segment([0, 0], [0, -3]), upper)).toBe(1);
    expect(distance(segment([1, -1], [3, -1]), upper)).toBe(1);
  });

  it('of arcs: apart, concentric, crossing, one in the other', () => {
    const upper = arc([0, 0], 1, 0, 180);
    expect(distance(upper, arc([3, 0], 1, 90, 180))).toBeCloseTo(1, 12);
    expect(distance(upper, arc([0, 0], 2, 10, 20))).toBeCloseTo(1, 12);
    expect(distance(upper, arc([0, 0], 2, 190, 160))).toBeGreaterThan(1);
    expect(distance(upper, arc([1, 0], 1, 90, 90))).toBe(0);
    expect(distance(upper, arc([0, 0.5], 0.2, 0, 180))).toBeCloseTo(0.3, 12);
    expect(distance(upper, upper)).toBe(0);
  });

  it('is the same either way round, and that of the nearest points, on random pairs', () => {
    const random = randomFrom(SEED);
    const between = (least: number, most: number): number => least + random() * (most - least);
    const point = (): XY => [between(-2, 2), between(-2, 2)];
    const curve = (): Curve =>
      random() < 0.5
        ? segment(point(), point())
        : arc(point(), between(0.01, 2), between(-360, 360), between(-180, 180));
    for (let i = 0; i < 300; i += 1) {
      const [a, b] = [curve(), curve()];
      const label = `seed ${SEED}, pair ${i}: ${JSON.stringify([a, b])}`;
      const exact = distance(a, b);
      const others = sampled(b);
      const seen = Math.min(
        ...sampled(a).map(([x, y]) => Math.min(...others.map(([u, v]) => Math.hypot(x - u, y - v)))),
      );
      if (Math.abs(distance(b, a) - exact) > 1e-9) fail(`not the same both ways, ${label}`);
      const coarse = (lengthOf(a) + lengthOf(b)) / STEPS;
      if (exact > seen + 1e-9 || exact < seen - coarse) fail(`${exact} against ${seen}, ${label}`);
    }
    expect(SEED).toBeGreaterThanOrEqual(0);
  });
});

describe('An arc', () => {
  it('covers its sweep, both ends included, in either direction and across 360°', () => {
    const up = arc([0, 0], 1, 350, 20);
    expect([350, 0, 10, 360, -10].every((angle) => covers(up, angle))).toBeTrue();
    expect([349, 11, 180].some((angle) => covers(up, angle))).toBeFalse();
    const down = arc([0, 0], 1, 10, -20);
    expect([350, 0, 10].every((angle) => covers(down, angle))).toBeTrue();
    expect([349, 11].some((angle) => covers(down, angle))).toBeFalse();
  });

  it('has its ends in its own order, exact at the quarters', () => {
    expect(ends(arc([1, 1], 2, -90, 90))).toEqual([
      [1, -1],
      [3, 1],
    ]);
    expect(ends(arc([0, 0], 1, 90, -90))).toEqual([
      [0, 1],
      [1, 0],
    ]);
  });
});
