import type { FigureHole, PartFigures } from '../part/figures';
import type { HoleResult } from '../result';
import type { Layout } from './lay-out';

/**
 * Holes carried to the blank: each one's station from the free end of leg 0.
 *
 * @param figures of the part @param layout of it
 * @returns one entry a hole, rows spread out; station null where the leg's own is
 * @source geometry
 */
export function holesOf(figures: PartFigures, layout: Layout): readonly HoleResult[] {
  return figures.holes.map((hole) => ({
    hole: hole.hole,
    leg: hole.leg,
    station: stationOf(hole, layout),
    across: hole.across,
    diameter: hole.diameter,
  }));
}

function stationOf(hole: FigureHole, layout: Layout): number | null {
  const leg = layout.legs[hole.leg]!;
  const before = layout.bends.findLast((bend) => bend.chain === leg.chain - 1);
  const after = layout.bends.find((bend) => bend.chain === leg.chain + 1);
  switch (hole.from) {
    case 'start':
      return plus(leg.start, hole.at);
    case 'end':
      return plus(leg.end, -hole.at);
    case 'mold-start':
      return plus(leg.start, hole.at - (before?.setback ?? 0));
    case 'mold-end':
      return plus(leg.end, (after?.setback ?? 0) - hole.at);
  }
}

const plus = (station: number | null, distance: number): number | null =>
  station === null ? null : station + distance;
