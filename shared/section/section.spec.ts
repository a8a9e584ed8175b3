import { bendDown, bendUp, figuresOf, partOf } from '../../tests/support/plain-part';
import { massOf } from './mass';
import { sectorProperties } from './sector';

const sectionOf = (chain: readonly unknown[], more: Record<string, unknown> = {}) =>
  figuresOf(partOf(chain, more)).section!;
const channel = (height: number, width: number, radius = 0.1): readonly unknown[] => [
  { leg: height },
  bendUp(90, radius),
  { leg: width },
  bendUp(90, radius),
  { leg: height },
];

describe('Section properties', () => {
  it('of a strip are those of a rectangle', () => {
    const section = sectionOf([{ leg: 2 }]);
    expect(section.area).toBeCloseTo(0.08, 15);
    expect(section.centroid.x).toBeCloseTo(1, 15);
    expect(section.centroid.y).toBeCloseTo(0.02, 15);
    expect(section.ix).toBeCloseTo((2 * 0.04 ** 3) / 12, 15);
    expect(section.iy).toBeCloseTo((0.04 * 2 ** 3) / 12, 15);
    expect(section.principal).toEqual({ i1: section.iy, i2: section.ix, angle: 90 });
    expect(section.radii.r1).toBeCloseTo(2 / Math.sqrt(12), 14);
  });

  it('name the axis as 0° or 90° for every symmetric channel, never −90°', () => {
    for (let i = 1; i <= 400; i += 1) {
      const { angle } = sectionOf(channel(0.5 + i / 331, 0.6 + i / 170, 0.05 + i / 5000)).principal;
      if (angle === null) continue;
      expect(Math.min(Math.abs(angle), Math.abs(angle - 90)))
        .withContext(`case ${i}: ${angle}`)
        .toBeLessThan(1e-9);
      expect(angle).toBeLessThanOrEqual(90);
    }
  });

  it('lean at 45° for an angle of equal legs', () => {
    const square = sectionOf([{ leg: 1 }, bendUp(90, 0), { leg: 1 }], { thickness: 0.04 });
    expect(square.ix).toBeCloseTo(square.iy, 14);
    expect(Math.abs(square.principal.angle!)).toBeCloseTo(45, 9);
  });

  it('of a Z and its mirror lean opposite ways', () => {
    const z = sectionOf([{ leg: 1 }, bendUp(90, 0.1), { leg: 2 }, bendDown(90, 0.1), { leg: 1 }]);
    const other = sectionOf([{ leg: 1 }, bendDown(90, 0.1), { leg: 2 }, bendUp(90, 0.1), { leg: 1 }]);
    expect(z.principal.angle).toBeCloseTo(-other.principal.angle!, 9);
    expect(z.ixy).toBeCloseTo(-other.ixy, 14);
    expect(z.ixy).toBeGreaterThan(0);
    // About the axis that leans with the Z, I is least: the axis of i1 leans the other way.
    const theta = (z.principal.angle! * Math.PI) / 180;
    const [c, s] = [Math.cos(theta), Math.sin(theta)];
    expect(z.ix * c * c + z.iy * s * s - 2 * z.ixy * s * c).toBeCloseTo(z.principal.i1, 12);
  });

  it('keep the sum of their moments, and the product within them', () => {
    const section = sectionOf([{ leg: 1 }, bendUp(75, 0.1), { leg: 1.3 }, bendDown(30, 0.2), { leg: 0.8 }]);
    expect(section.principal.i1 + section.principal.i2).toBeCloseTo(section.ix + section.iy, 14);
    expect(section.principal.i1 * section.principal.i2).toBeCloseTo(section.ix * section.iy - section.ixy ** 2, 14);
  });

  it('are none for a part that crosses itself or can not be formed', () => {
    expect(figuresOf(partOf(channel(1, 0.1))).section).toBeNull();
  });
});

describe('An annular sector', () => {
  it('agrees with its own sum over thin wedges', () => {
    for (const degrees of [10, 90, 180]) {
      const sector = sectorProperties(0.3, 0.5, degrees);
      const wedges = 20_000;
      const step = (degrees * Math.PI) / 180 / wedges;
      const sum = { area: 0, x: 0, xx: 0, yy: 0 };
      for (let i = 0; i < wedges; i += 1) {
        const angle = (-degrees / 2) * (Math.PI / 180) + (i + 0.5) * step;
        const [c, s] = [Math.cos(angle), Math.sin(angle)];
        sum.area += (step * (0.25 - 0.09)) / 2;
        sum.x += (step * c * (0.125 - 0.027)) / 3;
        sum.xx += (step * c * c * (0.0625 - 0.0081)) / 4;
        sum.yy += (step * s * s * (0.0625 - 0.0081)) / 4;
      }
      expect(sector.area / sum.area).toBeCloseTo(1, 9);
      expect(sector.centroid / (sum.x / sum.area)).toBeCloseTo(1, 7);
      expect(sector.alongAxis / sum.yy).toBeCloseTo(1, 6);
      expect(sector.acrossAxis / (sum.xx - sum.x ** 2 / sum.area)).toBeCloseTo(1, 5);
    }
  });

  it('of half a disc is that of the tables: 4R/3π and πR⁴/8', () => {
    const half = sectorProperties(0, 1, 180);
    expect(half.area).toBeCloseTo(Math.PI / 2, 14);
    expect(half.centroid).toBeCloseTo(4 / (3 * Math.PI), 14);
    expect(half.alongAxis).toBeCloseTo(Math.PI / 8, 14);
    expect(half.acrossAxis).toBeCloseTo(Math.PI / 8 - 8 / (9 * Math.PI), 14);
  });
});

describe('The mass of the blank', () => {
  it('is in pounds for an inch part and in kilograms for a millimetre part', () => {
    expect(massOf(100, 0.04, 0.1 * 27679.904710203125, 'in').value).toBeCloseTo(0.4, 12);
    expect(massOf(1e6, 1, 2700, 'mm')).toEqual({ value: jasmine.any(Number) as unknown as number, unit: 'kg' });
    expect(massOf(1e6, 1, 2700, 'mm').value).toBeCloseTo(2.7, 12);
  });
});
