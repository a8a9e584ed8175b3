/** Where each leg and bend of the formed part lies, so that dimensions and leaders have something to point at. */
import { sides } from '@shared/formed/faces';
import type { Bar, Sector } from '@shared/formed/solid';
import { solidsOf } from '@shared/formed/solids-of';
import type { Arc } from '@shared/geometry/curve';
import { arcPoint, ends } from '@shared/geometry/curve';
import type { Solved, XY } from '@shared/result';
import type { Point } from './point';

export type Face = 'lower' | 'upper';

export interface Stretch {
  /** Index in `legs`; null for the straight inside a joggle. */
  readonly leg: number | null;
  readonly chain: number;
  /** Degrees from +x. */
  readonly heading: number;
  readonly lower: readonly [Point, Point];
  readonly upper: readonly [Point, Point];
}

export interface Curve {
  /** Index in `bends`. */
  readonly bend: number;
  readonly chain: number;
  readonly lower: Arc;
  readonly upper: Arc;
  /** 1 up (counter-clockwise), −1 down. */
  readonly sense: 1 | -1;
}

export interface Frames {
  /** Alternating: one stretch more than curves. */
  readonly stretches: readonly Stretch[];
  readonly curves: readonly Curve[];
}

const toPoint = ([x, y]: XY): Point => ({ x, y });

/** Null when a figure it stands on is missing, as after a consumed leg. */
export function formedFrames(solved: Solved): Frames | null {
  const solids = solidsOf(solved);
  if (!solids) return null;
  const stretches: Stretch[] = [];
  const curves: Curve[] = [];
  for (const solid of solids) {
    if (solid.kind === 'bar') stretches.push(stretchOf(solid, solved.thickness));
    else curves.push(curveOf(solid, solved.thickness));
  }
  return { stretches, curves };
}

function stretchOf(bar: Bar, thickness: number): Stretch {
  const [upper, lower] = sides(bar, thickness).map((side): readonly [Point, Point] => {
    const [start, end] = ends(side);
    return [toPoint(start), toPoint(end)];
  }) as [Stretch['upper'], Stretch['lower']];
  return { leg: bar.leg, chain: bar.chain, heading: bar.heading, lower, upper };
}

function curveOf(sector: Sector, thickness: number): Curve {
  const [upper, lower] = sides(sector, thickness) as readonly [Arc, Arc];
  return { bend: sector.bend, chain: sector.chain, lower, upper, sense: sector.sweep > 0 ? 1 : -1 };
}

/** A point of a curve: on its lower or upper face, at a part (0 to 1) of its sweep. */
export function onCurve(curve: Curve, face: Face, part: number): Point {
  const arc = curve[face];
  return toPoint(arcPoint(arc, arc.from + arc.sweep * part));
}
