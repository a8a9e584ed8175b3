import { crossingsOf } from '../../shared/formed/crossings';
import { curveOf } from '../../shared/formed/outline';
import { formSolids, type Solid } from '../../shared/formed/solid';
import { arcPoint, type Curve, ends } from '../../shared/geometry/curve';
import { direction } from '../../shared/geometry/direction';
import { layOut } from '../../shared/layout/lay-out';
import type { PartDocument } from '../../shared/part/document';
import { evaluateDocument } from '../../shared/part/evaluate';
import type { FaceElement, XY } from '../../shared/result';
import { sectionOf } from '../../shared/section/section';
import { figuresOf } from '../support/plain-part';
import { randomFrom, SEED } from '../support/seed';
import { randomPart } from '../support/random-chains';
import { Worst } from './worst';

const CASES = 1000;
const NEAR = 1e-9;

interface Formed {
  readonly document: PartDocument;
  readonly thickness: number;
  readonly solids: readonly Solid[];
  /** Takes a miss as a part of what is allowed: above 1 is a failure. */
  readonly off: (miss: number, allowed?: number) => void;
}

function law(holds: (formed: Formed) => void): void {
  const random = randomFrom(SEED + 2);
  const worst = new Worst(1);
  for (let i = 0; i < CASES; i += 1) {
    const { document, thickness } = randomPart(random);
    const evaluated = evaluateDocument(document);
    if (!evaluated.ok) throw new Error(JSON.stringify(evaluated.errors));
    const solids = formSolids(layOut(evaluated.figures).pieces!, thickness);
    const off = (miss: number, allowed = NEAR): void => worst.note(miss / allowed, `seed ${SEED}, case ${i}`);
    holds({ document, thickness, solids, off });
  }
  worst.expectWithin();
}

const apart = (a: XY, b: XY): number => Math.hypot(a[0] - b[0], a[1] - b[1]);
const headingAt = (curve: Curve, end: 0 | 1): number => {
  if (curve.kind === 'segment')
    return (Math.atan2(curve.to[1] - curve.from[1], curve.to[0] - curve.from[0]) * 180) / Math.PI;
  const at = curve.from + (end === 0 ? 0 : curve.sweep);
  return at + Math.sign(curve.sweep) * 90;
};
const turnBetween = (a: number, b: number): number => Math.abs(((((b - a) % 360) + 540) % 360) - 180);

/** The face as points, arcs cut fine. */
const points = (face: readonly FaceElement[]): XY[] =>
  face.flatMap((element): XY[] => {
    const curve = curveOf(element);
    if (curve.kind === 'segment') return [...ends(curve)];
    const steps = 200;
    return Array.from({ length: steps + 1 }, (_, i) => arcPoint(curve, curve.from + (curve.sweep * i) / steps));
  });

/** Area, first and second moments of a polygon by Green's theorem, about the origin. */
function polygonMoments(outline: readonly XY[]): {
  area: number;
  x: number;
  y: number;
  ix: number;
  iy: number;
  ixy: number;
} {
  const sum = { area: 0, x: 0, y: 0, ix: 0, iy: 0, ixy: 0 };
  outline.forEach(([x0, y0], i) => {
    const [x1, y1] = outline[(i + 1) % outline.length]!;
    const cross = x0 * y1 - x1 * y0;
    sum.area += cross / 2;
    sum.x += (cross * (x0 + x1)) / 6;
    sum.y += (cross * (y0 + y1)) / 6;
    sum.ix += (cross * (y0 * y0 + y0 * y1 + y1 * y1)) / 12;
    sum.iy += (cross * (x0 * x0 + x0 * x1 + x1 * x1)) / 12;
    sum.ixy += (cross * (x0 * y1 + 2 * x0 * y0 + 2 * x1 * y1 + x1 * y0)) / 24;
  });
  return sum;
}

describe('Laws of the formed part, on 1,000 random chains', () => {
  it('both faces run without a gap or a corner, a sharp inside bend excepted, and close at both cut edges', () => {
    law(({ document, thickness, off }) => {
      const { upper, lower } = figuresOf(document).formed!.faces!;
      const sharp = document.chain.some((entry) => 'radius' in entry && entry.radius === 0);
      for (const face of [upper, lower]) {
        const curves = face.map(curveOf);
        curves.slice(1).forEach((curve, i) => {
          off(apart(ends(curves[i]!)[1], ends(curve)[0]));
          if (!sharp) off(turnBetween(headingAt(curves[i]!, 1), headingAt(curve, 0)), 1e-6);
        });
      }
      const [first, last] = [upper.map(curveOf), lower.map(curveOf)];
      off(apart(ends(first[0]!)[0], ends(last[0]!)[0]) - thickness);
      off(apart(ends(first.at(-1)!)[1], ends(last.at(-1)!)[1]) - thickness);
    });
  });

  it('mirror: the other hand is the same shape seen from below', () => {
    law(({ document, thickness, off }) => {
      const [as, mirrored] = [figuresOf(document), figuresOf({ ...document, hand: 'opposite' })];
      const [up, down] = [points(as.formed!.faces!.upper), points(mirrored.formed!.faces!.lower)];
      up.forEach(([x, y], i) => {
        off(apart([x, thickness - y], down[i]!));
      });
      if (as.section === null || mirrored.section === null) {
        off(as.section === mirrored.section ? 0 : Infinity);
        return;
      }
      const scale = as.section.principal.i1;
      off(as.section.ix - mirrored.section.ix, NEAR * scale);
      off(as.section.ixy + mirrored.section.ixy, NEAR * scale);
    });
  });

  it('section: agrees with the polygon of the faces cut fine', () => {
    let compared = 0;
    law(({ document, off }) => {
      const { section, formed } = figuresOf(document);
      if (section === null) return;
      compared += 1;
      const { upper, lower } = formed!.faces!;
      const sum = polygonMoments([...points(lower), ...points(upper).reverse()]);
      const [x, y] = [sum.x / sum.area, sum.y / sum.area];
      const scale = section.principal.i1;
      off(section.area / sum.area - 1, 1e-4);
      off(Math.hypot(section.centroid.x - x, section.centroid.y - y), 1e-3 * section.radii.r1);
      off(section.ix - (sum.ix - sum.area * y * y), 1e-3 * scale);
      off(section.iy - (sum.iy - sum.area * x * x), 1e-3 * scale);
      off(section.ixy - (sum.ixy - sum.area * x * y), 1e-3 * scale);
    });
    expect(compared).toBeGreaterThan(CASES / 10);
  });

  it('rigid motion: moved and turned, the principal moments stay and the axis turns along', () => {
    const random = randomFrom(SEED + 3);
    law(({ thickness, solids, off }) => {
      const turn = random() * 360;
      const [dx, dy] = [random() * 10 - 5, random() * 10 - 5];
      const { x, y } = direction(turn);
      const moved = ([px, py]: XY): XY => [x * px - y * py + dx, y * px + x * py + dy];
      const other = solids.map((solid): Solid => {
        const rest = { start: moved(solid.start), heading: solid.heading + turn };
        return solid.kind === 'bar'
          ? { ...solid, ...rest }
          : { ...solid, ...rest, centre: moved(solid.centre), from: solid.from + turn };
      });
      const [a, b] = [sectionOf(solids, thickness), sectionOf(other, thickness)];
      const scale = a.principal.i1;
      off(a.area / b.area - 1);
      off(apart(moved([a.centroid.x, a.centroid.y]), [b.centroid.x, b.centroid.y]));
      off(a.principal.i1 - b.principal.i1, NEAR * scale);
      off(a.principal.i2 - b.principal.i2, NEAR * scale);
      if (a.principal.i1 - a.principal.i2 < 0.01 * scale) return;
      const along = turnBetween(2 * (a.principal.angle! + turn), 2 * b.principal.angle!);
      off(along, 1e-6);
    });
  });

  it('envelope: holds every point of both faces and touches them on all four sides', () => {
    law(({ document, off }) => {
      const { formed, legs } = figuresOf(document);
      const { width, height, seat } = formed!.envelope!;
      const solids = formSolids(layOut(evaluated(document)).pieces!, document.thickness as number);
      const bar = solids.find((solid) => solid.kind === 'bar' && solid.leg === seat)!;
      const { x, y } = direction(bar.heading);
      const all = [...points(formed!.faces!.upper), ...points(formed!.faces!.lower)];
      const along = all.map(([px, py]) => px * x + py * y);
      const across = all.map(([px, py]) => py * x - px * y);
      const span = (list: readonly number[]): number => Math.max(...list) - Math.min(...list);
      // Points cut from arcs lie a little inside the arcs' own extremes.
      for (const [figure, seen] of [
        [width, span(along)],
        [height, span(across)],
      ] as const) {
        off(Math.max(0, seen - figure));
        off(Math.max(0, figure - seen), 5e-5);
      }
      off(legs[seat]!.flat - Math.max(...legs.map((leg) => leg.flat)));
    });
  });

  it('crossings: turning the whole part over finds the same pairs', () => {
    law(({ document, thickness, solids, off }) => {
      const mirrored = formSolids(layOut(evaluated({ ...document, hand: 'opposite' })).pieces!, thickness);
      const [as, turned] = [crossingsOf(solids, thickness), crossingsOf(mirrored, thickness)];
      off(JSON.stringify(as) === JSON.stringify(turned) ? 0 : Infinity);
    });
  });
});

function evaluated(document: PartDocument) {
  const evaluation = evaluateDocument(document);
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.errors));
  return evaluation.figures;
}
