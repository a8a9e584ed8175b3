import { arcPoint, type Curve, covers, ends } from '../geometry/curve';
import { direction } from '../geometry/direction';
import { exceeds } from '../geometry/tolerance';
import type { LegResult, XY } from '../result';
import { sides } from './faces';
import type { Bar, Solid } from './solid';

export interface Envelope {
  readonly width: number;
  readonly height: number;
  readonly seat: number;
}

/**
 * Overall width and height with the seat leg lying level.
 *
 * @param solids the formed part @param thickness T @param legs for the default seat
 * @param seat index of the level leg, or null for the leg with the largest flat (the first on a tie)
 * @returns width along the seat leg, height square to it, in the part's unit
 * @source geometry: the extremes of exact lines and arcs
 */
export function envelopeOf(
  solids: readonly Solid[],
  thickness: number,
  legs: readonly LegResult[],
  seat: number | null,
): Envelope {
  const level = seat ?? largestFlat(legs);
  const bar = solids.find((solid): solid is Bar => solid.kind === 'bar' && solid.leg === level)!;
  const box = extent(
    solids.flatMap((solid) => sides(solid, thickness)),
    bar.heading,
  );
  return { width: box[2] - box[0], height: box[3] - box[1], seat: level };
}

/** Smallest box [x0, y0, x1, y1] around curves, in a frame turned by `heading` degrees. */
export function extent(curves: readonly Curve[], heading = 0): readonly [number, number, number, number] {
  const { x, y } = direction(heading);
  let [x0, y0, x1, y1] = [Infinity, Infinity, -Infinity, -Infinity];
  const take = ([px, py]: XY): void => {
    const u = px * x + py * y;
    const v = py * x - px * y;
    x0 = Math.min(x0, u);
    x1 = Math.max(x1, u);
    y0 = Math.min(y0, v);
    y1 = Math.max(y1, v);
  };
  for (const curve of curves) {
    ends(curve).forEach(take);
    if (curve.kind === 'segment') continue;
    for (let quarter = 0; quarter < 360; quarter += 90) {
      if (covers(curve, quarter + heading)) take(arcPoint(curve, quarter + heading));
    }
  }
  return [x0, y0, x1, y1];
}

function largestFlat(legs: readonly LegResult[]): number {
  return legs.reduce((best, leg, i) => (exceeds(leg.flat, legs[best]!.flat) ? i : best), 0);
}
