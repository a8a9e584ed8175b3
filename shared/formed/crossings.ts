/** Where the formed part runs into itself. */
import { type Curve, distance, ends, segment } from '../geometry/curve';
import { direction } from '../geometry/direction';
import { isReturnBend, TOUCHING } from '../geometry/tolerance';
import type { XY } from '../result';
import { extent } from './envelope';
import { sides } from './faces';
import type { Solid } from './solid';

interface Body {
  readonly index: number;
  readonly solid: Solid;
  readonly boundary: readonly Curve[];
  readonly box: readonly [number, number, number, number];
}

/**
 * Pieces that are no neighbours and come nearer than 1e-9 of the part's size.
 *
 * Bodies are swept in order of their left edge, so that only those whose boxes overlap are compared.
 *
 * @param solids the formed part @param thickness T > 0
 * @returns pairs of the solids' chain indices, in order, each once
 * @source geometry: exact distances between lines and arcs, and containment
 */
export function crossingsOf(solids: readonly Solid[], thickness: number): readonly (readonly [number, number])[] {
  const bodies = solids.filter(hasSubstance).map((solid, index): Body => {
    const boundary = boundaryOf(solid, thickness);
    return { index, solid, boundary, box: extent(boundary) };
  });
  const size = Math.max(...spread(bodies));
  const near = TOUCHING * size;
  const byLeft = [...bodies].sort((a, b) => a.box[0] - b.box[0]);
  const found: [number, number][] = [];
  byLeft.forEach((a, i) => {
    for (let j = i + 1; j < byLeft.length; j += 1) {
      const b = byLeft[j]!;
      if (b.box[0] > a.box[2] + near) break;
      if (b.box[1] > a.box[3] + near || b.box[3] < a.box[1] - near) continue;
      const [first, second] = a.index < b.index ? [a, b] : [b, a];
      if (areNeighbours(first, second, bodies) || !touch(first, second, near)) continue;
      found.push([first.solid.chain, second.solid.chain]);
    }
  });
  found.sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  return found.filter((pair, i) => i === 0 || pair[0] !== found[i - 1]![0] || pair[1] !== found[i - 1]![1]);
}

/** A joggle at its shortest run has no straight between its bends, which then are neighbours. */
const hasSubstance = (solid: Solid): boolean => solid.kind === 'sector' || solid.length > 0;

/**
 * Next to each other; or the pieces of one joggle, whose bends lie on either side of the tangent between them; or the two
 * straights of one bend below 180°, which lean away from each other and at most share its corner.
 */
function areNeighbours(a: Body, b: Body, bodies: readonly Body[]): boolean {
  if (b.index - a.index <= 1 || a.solid.chain === b.solid.chain) return true;
  const between = bodies[a.index + 1]!.solid;
  return b.index - a.index === 2 && between.kind === 'sector' && !isReturnBend(Math.abs(between.sweep));
}

function touch(a: Body, b: Body, near: number): boolean {
  if (a.boundary.some((curve) => b.boundary.some((other) => distance(curve, other) < near))) return true;
  return (
    contains(a.solid, ends(b.boundary[0]!)[0], a.boundary) || contains(b.solid, ends(a.boundary[0]!)[0], b.boundary)
  );
}

/** Both faces and both cut edges of a piece. */
function boundaryOf(solid: Solid, thickness: number): readonly Curve[] {
  const [upper, lower] = sides(solid, thickness);
  const [u, v] = [ends(upper), ends(lower)];
  return [upper, lower, segment(u[0], v[0]), segment(u[1], v[1])];
}

function contains(solid: Solid, point: XY, boundary: readonly Curve[]): boolean {
  if (solid.kind === 'bar') {
    const { x, y } = direction(solid.heading);
    const [dx, dy] = [point[0] - solid.start[0], point[1] - solid.start[1]];
    const [along, up] = [dx * x + dy * y, dy * x - dx * y];
    const edge = boundary[2] as { from: XY; to: XY };
    const thickness = Math.hypot(edge.to[0] - edge.from[0], edge.to[1] - edge.from[1]);
    return along > 0 && along < solid.length && up > 0 && up < thickness;
  }
  const [dx, dy] = [point[0] - solid.centre[0], point[1] - solid.centre[1]];
  const reach = Math.hypot(dx, dy);
  if (reach <= solid.inner || reach >= solid.outer) return false;
  const angle = (Math.atan2(dy, dx) * 180) / Math.PI;
  const past = solid.sweep > 0 ? angle - solid.from : solid.from - angle;
  return ((past % 360) + 360) % 360 < Math.abs(solid.sweep);
}

function spread(bodies: readonly Body[]): readonly [number, number] {
  const [x0, y0, x1, y1] = bodies.reduce(
    (box, body) => [
      Math.min(box[0]!, body.box[0]),
      Math.min(box[1]!, body.box[1]),
      Math.max(box[2]!, body.box[2]),
      Math.max(box[3]!, body.box[3]),
    ],
    [Infinity, Infinity, -Infinity, -Infinity],
  );
  return [x1! - x0!, y1! - y0!];
}
