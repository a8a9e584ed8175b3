/** Lines and arcs of a section, and how near they come to each other. */
import type { XY } from '../result';
import { direction } from './direction';

export interface Segment {
  readonly kind: 'segment';
  readonly from: XY;
  readonly to: XY;
}

export interface Arc {
  readonly kind: 'arc';
  readonly centre: XY;
  readonly radius: number;
  /** Degrees counter-clockwise from +x where it begins. */
  readonly from: number;
  /** Degrees, positive counter-clockwise, at most 180 either way. */
  readonly sweep: number;
}

export type Curve = Segment | Arc;

/**
 * Shortest distance between two curves, 0 where they meet.
 *
 * @param a @param b segments or arcs, in one unit @returns the distance in that unit
 * @example distance(segment([0, 0], [1, 0]), segment([0, 2], [1, 2])) // 2
 */
export function distance(a: Curve, b: Curve): number {
  if (a.kind === 'segment' && b.kind === 'segment') return segmentToSegment(a, b);
  if (a.kind === 'segment') return segmentToArc(a, b as Arc);
  if (b.kind === 'segment') return segmentToArc(b, a);
  return arcToArc(a, b);
}

export const segment = (from: XY, to: XY): Segment => ({ kind: 'segment', from, to });

/** Both ends of a curve, in its own order. */
export function ends(curve: Curve): readonly [XY, XY] {
  if (curve.kind === 'segment') return [curve.from, curve.to];
  return [arcPoint(curve, curve.from), arcPoint(curve, curve.from + curve.sweep)];
}

/** The point of a circle at an angle in degrees. */
export function arcPoint(arc: Pick<Arc, 'centre' | 'radius'>, degrees: number): XY {
  const { x, y } = direction(degrees);
  return [arc.centre[0] + arc.radius * x, arc.centre[1] + arc.radius * y];
}

/** Whether the direction at an angle in degrees lies within the arc's sweep. */
export function covers(arc: Arc, degrees: number): boolean {
  const past = arc.sweep >= 0 ? degrees - arc.from : arc.from - degrees;
  const turned = ((past % 360) + 360) % 360;
  return turned <= Math.abs(arc.sweep);
}

function segmentToSegment(a: Segment, b: Segment): number {
  if (properlyCross(a, b)) return 0;
  return Math.min(
    pointToSegment(a.from, b),
    pointToSegment(a.to, b),
    pointToSegment(b.from, a),
    pointToSegment(b.to, a),
  );
}

function segmentToArc(a: Segment, b: Arc): number {
  const along = minus(a.to, a.from);
  const length = Math.hypot(along[0], along[1]);
  let nearest = Math.min(pointToArc(a.from, b), pointToArc(a.to, b), ...ends(b).map((end) => pointToSegment(end, a)));
  if (length === 0) return nearest;
  const unit: XY = [along[0] / length, along[1] / length];
  const toCentre = minus(b.centre, a.from);
  const foot = dot(toCentre, unit);
  const off = Math.abs(cross(unit, toCentre));
  if (off <= b.radius) {
    const half = Math.sqrt(b.radius * b.radius - off * off);
    for (const t of [foot - half, foot + half]) {
      if (t >= 0 && t <= length && covers(b, angleOf(b.centre, at(a.from, unit, t)))) return 0;
    }
  }
  if (foot > 0 && foot < length) nearest = Math.min(nearest, pointToArc(at(a.from, unit, foot), b));
  return nearest;
}

function arcToArc(a: Arc, b: Arc): number {
  const between = minus(b.centre, a.centre);
  const apart = Math.hypot(between[0], between[1]);
  let nearest = Math.min(...ends(a).map((end) => pointToArc(end, b)), ...ends(b).map((end) => pointToArc(end, a)));
  if (apart === 0) return nearest;
  const line = (Math.atan2(between[1], between[0]) * 180) / Math.PI;
  if (apart <= a.radius + b.radius && apart >= Math.abs(a.radius - b.radius) && a.radius > 0 && b.radius > 0) {
    const cosine = (apart * apart + a.radius * a.radius - b.radius * b.radius) / (2 * apart * a.radius);
    const spread = (Math.acos(Math.min(1, Math.max(-1, cosine))) * 180) / Math.PI;
    for (const angle of [line - spread, line + spread]) {
      if (covers(a, angle) && covers(b, angleOf(b.centre, arcPoint(a, angle)))) return 0;
    }
  }
  for (const angle of [line, line + 180]) {
    if (covers(a, angle)) nearest = Math.min(nearest, pointToArc(arcPoint(a, angle), b));
    if (covers(b, angle)) nearest = Math.min(nearest, pointToArc(arcPoint(b, angle), a));
  }
  return nearest;
}

function pointToSegment(point: XY, line: Segment): number {
  const along = minus(line.to, line.from);
  const squared = dot(along, along);
  const t = squared === 0 ? 0 : Math.min(1, Math.max(0, dot(minus(point, line.from), along) / squared));
  return Math.hypot(line.from[0] + t * along[0] - point[0], line.from[1] + t * along[1] - point[1]);
}

function pointToArc(point: XY, arc: Arc): number {
  const out = minus(point, arc.centre);
  const reach = Math.hypot(out[0], out[1]);
  if (reach > 0 && covers(arc, angleOf(arc.centre, point))) return Math.abs(reach - arc.radius);
  return Math.min(...ends(arc).map((end) => Math.hypot(end[0] - point[0], end[1] - point[1])));
}

function properlyCross(a: Segment, b: Segment): boolean {
  const side = (line: Segment, point: XY): number =>
    Math.sign(cross(minus(line.to, line.from), minus(point, line.from)));
  return side(a, b.from) * side(a, b.to) < 0 && side(b, a.from) * side(b, a.to) < 0;
}

const minus = (a: XY, b: XY): XY => [a[0] - b[0], a[1] - b[1]];
const dot = (a: XY, b: XY): number => a[0] * b[0] + a[1] * b[1];
const cross = (a: XY, b: XY): number => a[0] * b[1] - a[1] * b[0];
const at = (from: XY, unit: XY, t: number): XY => [from[0] + t * unit[0], from[1] + t * unit[1]];
const angleOf = (centre: XY, point: XY): number =>
  (Math.atan2(point[1] - centre[1], point[0] - centre[0]) * 180) / Math.PI;
