import { sectorProperties } from '../../shared/section/sector';
import type { Section } from '../../shared/result';
import { bendDown, bendUp, figuresOf, partOf } from '../support/plain-part';

const AISI = 'AISI Manual, Cold-Formed Steel Design (2017), tabulated section';

function sectionOf(legs: readonly number[], turns: readonly ('up' | 'down')[], radius: number, thickness: number) {
  const chain = legs.flatMap((leg, i) =>
    i === 0 ? [{ leg }] : [turns[i - 1] === 'up' ? bendUp(90, radius) : bendDown(90, radius), { leg }],
  );
  const solved = figuresOf(partOf(chain, { thickness }));
  return { section: solved.section!, seat: solved.formed!.envelope! };
}

/** The published sections stand with the web upright: the axis of greatest stiffness is their x. */
const strong = (section: Section): number => section.principal.i1;
const weak = (section: Section): number => section.principal.i2;

describe('Published cold-formed sections with their corner radii', () => {
  it(`600T125-54 plain channel (${AISI}, second-hand): A 0.480, Ix 2.34, Iy 0.0539, centroid 0.204 from the web`, () => {
    const { section } = sectionOf([1.25, 6.198, 1.25], ['up', 'up'], 0.0849, 0.0566);
    expect(Math.abs(section.area - 0.48)).toBeLessThan(0.0005);
    expect(Math.abs(strong(section) - 2.34)).toBeLessThan(0.005);
    // Exact geometry gives 0.0540; the printed figure comes from the centre-line method.
    expect(Math.abs(weak(section) - 0.0539)).toBeLessThan(0.0002);
    expect(weak(section)).toBeCloseTo(0.05402, 5);
    // Leg 0 runs along +x and its outside is y = 0, so the web's outside is x = 1.25.
    expect(Math.abs(1.25 - section.centroid.x - 0.204)).toBeLessThan(0.0005);
  });

  it(`362S162-54 lipped channel (${AISI}; dimensions from memory of the product code): A 0.422, rx 1.44, ry 0.605, Sx 0.482, Sy 0.142`, () => {
    const { section } = sectionOf([0.5, 1.625, 3.625, 1.625, 0.5], ['up', 'up', 'up', 'up'], 0.0849, 0.0566);
    expect(Math.abs(section.area - 0.422)).toBeLessThan(0.0005);
    expect(Math.abs(section.radii.r1 - 1.44)).toBeLessThan(0.005);
    expect(Math.abs(section.radii.r2 - 0.605)).toBeLessThan(0.0005);
    expect(Math.abs(strong(section) / (3.625 / 2) - 0.482)).toBeLessThan(0.0005);
    // The web is parallel to the first lip and lies at the top of the frame, y = 1.625.
    const toLipSide = section.centroid.y;
    expect(Math.abs(weak(section) / toLipSide - 0.142)).toBeLessThan(0.0005);
  });

  it(`12CS4×105 lipped channel (${AISI}; dimensions from memory): A 2.20, rx 4.65, ry 1.39, Sx 7.91, Sy 1.45`, () => {
    const { section } = sectionOf([0.885, 4, 12, 4, 0.885], ['up', 'up', 'up', 'up'], 0.1875, 0.105);
    expect(Math.abs(section.area - 2.2)).toBeLessThan(0.005);
    expect(Math.abs(section.radii.r1 - 4.65)).toBeLessThan(0.005);
    expect(Math.abs(section.radii.r2 - 1.39)).toBeLessThan(0.005);
    expect(Math.abs(strong(section) / 6 - 7.91)).toBeLessThan(0.005);
    expect(Math.abs(weak(section) / section.centroid.y - 1.45)).toBeLessThan(0.005);
  });

  it('90° corner, R 3/16, t .105 (AISI flexural-member worked sheet, second-hand): arc .3768, area .0396, centroid .1553 along each leg', () => {
    const corner = sectorProperties(0.1875, 0.2925, 90);
    expect(Math.abs((Math.PI / 2) * 0.24 - 0.3768)).toBeLessThan(0.0003);
    expect(Math.abs(corner.area - 0.0396)).toBeLessThan(0.00005);
    expect(Math.abs(corner.centroid * Math.SQRT1_2 - 0.1553)).toBeLessThan(0.0002);
  });

  it('a thin corner tends to the line element: 1.57 r, 0.637 r, 0.149 r³ (AISI linear method table, from memory)', () => {
    const thin = sectorProperties(0.999999, 1.000001, 90);
    const length = thin.area / 2e-6;
    expect(Math.abs(length - 1.57)).toBeLessThan(0.005);
    expect(Math.abs(thin.centroid * Math.SQRT1_2 - 0.637)).toBeLessThan(0.0005);
    const parallel = (thin.alongAxis + thin.acrossAxis) / 2 / 2e-6;
    expect(Math.abs(parallel - 0.149)).toBeLessThan(0.0005);
  });
});

describe('Sections by exact geometry (own arithmetic, not published; kept as a second computation)', () => {
  it('annular sector 90°, Ri 0.16, Ro 0.20', () => {
    const sector = sectorProperties(0.16, 0.2, 90);
    expect(sector.area).toBeCloseTo(0.01130973, 8);
    expect(sector.centroid).toBeCloseTo(0.1627238, 7);
    expect(sector.alongAxis / 6.73996e-5).toBeCloseTo(1, 5);
    expect((sector.acrossAxis + sector.area * sector.centroid ** 2) / 0.00030356).toBeCloseTo(1, 5);
  });

  it('hat, height 1, crown 1 outside, foot 0.60 from the outer face of the web (so 0.64 to its far face)', () => {
    const { section } = sectionOf([0.64, 1, 1, 1, 0.64], ['up', 'down', 'down', 'up'], 0.125, 0.04);
    expect(section.area / 0.1548425).toBeCloseTo(1, 5);
    expect(section.centroid.y / 0.4652808).toBeCloseTo(1, 5);
    expect(section.ix / 0.0235053).toBeCloseTo(1, 5);
    expect(section.iy / 0.0509132).toBeCloseTo(1, 5);
    expect(Math.abs(section.ixy)).toBeLessThan(1e-15);
  });
});
