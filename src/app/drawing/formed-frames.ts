/** Where each leg and bend of the formed part lies, so that dimensions and leaders have something to point at. */
import type { Solved } from '@shared/result';
import type { Point } from './point';

export interface Stretch {
  /** Index in `legs`; null for the straight inside a joggle. */
  readonly leg: number | null;
  readonly chain: number;
  /** Lower face, at the start and the end. */
  readonly start: Point;
  readonly end: Point;
  /** Radians from +x. */
  readonly heading: number;
}

export interface Curve {
  /** Index in `bends`. */
  readonly bend: number;
  readonly chain: number;
  readonly centre: Point;
  readonly lowerRadius: number;
  readonly upperRadius: number;
  /** 1 up (counter-clockwise), −1 down. */
  readonly sense: 1 | -1;
  readonly from: number;
  readonly sweep: number;
}

export interface Frames {
  readonly thickness: number;
  /** Alternating: one stretch more than curves. */
  readonly stretches: readonly Stretch[];
  readonly curves: readonly Curve[];
}

export const normal = (heading: number): Point => ({ x: -Math.sin(heading), y: Math.cos(heading) });
export const forward = (heading: number): Point => ({ x: Math.cos(heading), y: Math.sin(heading) });

const moved = (from: Point, by: Point, length: number): Point => ({
  x: from.x + by.x * length,
  y: from.y + by.y * length,
});

/** Null when a figure it stands on is missing, as after a consumed leg. */
export function formedFrames(solved: Solved): Frames | null {
  if (!solved.formed?.faces) return null;
  const T = solved.thickness;
  const stretches: Stretch[] = [];
  const curves: Curve[] = [];
  let place: Point = { x: 0, y: 0 };
  let heading = 0;
  let next = 0;

  const straight = (leg: number | null, chain: number, length: number): void => {
    const end = moved(place, forward(heading), length);
    stretches.push({ leg, chain, start: place, end, heading });
    place = end;
  };
  const turn = (): void => {
    const bend = solved.bends[next];
    if (!bend) return;
    const sense = bend.turn === 'up' ? 1 : -1;
    const lowerRadius = sense === 1 ? bend.radius + T : bend.radius;
    const upperRadius = sense === 1 ? bend.radius : bend.radius + T;
    const centre = moved(place, normal(heading), sense * lowerRadius);
    const sweep = (bend.angle * Math.PI) / 180;
    curves.push({ bend: next, chain: bend.chain, centre, lowerRadius, upperRadius, sense, from: heading, sweep });
    heading += sense * sweep;
    place = moved(centre, normal(heading), -sense * lowerRadius);
    next += 1;
  };

  for (const [index, leg] of solved.legs.entries()) {
    straight(index, leg.chain, leg.flat);
    const bend = solved.bends[next];
    if (!bend) continue;
    turn();
    if (bend.joggle === null) continue;
    const joggle = solved.joggles[bend.joggle];
    if (!joggle || joggle.straight === null) return null;
    straight(null, joggle.chain, joggle.straight);
    turn();
  }
  return { thickness: T, stretches, curves };
}

/** A point of a curve: on its lower or upper face, at a part (0 to 1) of its sweep. */
export function onCurve(curve: Curve, face: 'lower' | 'upper', part: number): Point {
  const radius = face === 'lower' ? curve.lowerRadius : curve.upperRadius;
  return moved(curve.centre, normal(curve.from + curve.sense * curve.sweep * part), -curve.sense * radius);
}

/** The upper or lower face of a stretch. */
export function faceOf(stretch: Stretch, face: 'lower' | 'upper', thickness: number): [Point, Point] {
  if (face === 'lower') return [stretch.start, stretch.end];
  const up = normal(stretch.heading);
  return [moved(stretch.start, up, thickness), moved(stretch.end, up, thickness)];
}
