/** Every leg dimensioned as it is measured, each where it clashes with nothing. */
import { direction as headingOf } from '@shared/geometry/direction';
import type { LegResult, Solved } from '@shared/result';
import type { Clearance } from './clearance';
import { CLASH } from './clearance';
import type { DimensionPlan, FigurePlace } from './dimension';
import { planDimension } from './dimension';
import type { Face, Frames, Stretch } from './formed-frames';
import { facePoints } from './formed-outline';
import type { Mark } from './marks';
import type { Point } from './point';
import { along, direction } from './point';
import type { View } from './view';

const OFFSETS = [28, 46, 64, 86, 110, 138];
/** Clear of the whole part, when there is nowhere nearer; on a part of many legs long extension lines would only confuse. */
const OUTSIDE = [28, 48, 68];
const FEW_LEGS = 9;
const FIGURES: readonly FigurePlace[] = ['between', 'past-end', 'past-start'];

export interface LegDimensions {
  readonly marks: readonly Mark[];
  /** Legs whose dimension found no room. */
  readonly left: number;
}

export function legDimensions(
  solved: Solved,
  frames: Frames,
  view: View,
  clearance: Clearance,
  figureOf: (length: number) => string,
): LegDimensions {
  const marks: Mark[] = [];
  let left = 0;
  // The long ones first: they have the fewest places to go.
  const order = frames.stretches
    .flatMap((stretch, index) => {
      const leg = stretch.leg === null ? undefined : solved.legs[stretch.leg];
      return leg ? [{ leg, stretch, outer: outerFace(frames, index) }] : [];
    })
    .sort((a, b) => b.leg.dimension - a.leg.dimension);
  for (const { leg, stretch, outer } of order) {
    const plan = bestPlan(leg, stretch, outer, frames, view, clearance, figureOf(leg.dimension));
    if (!plan) left += 1;
    else {
      marks.push(...plan.marks());
      clearance.add(plan.footprint);
    }
  }
  return { marks, left };
}

function bestPlan(
  leg: LegResult,
  stretch: Stretch,
  outer: Face,
  frames: Frames,
  view: View,
  clearance: Clearance,
  text: string,
): DimensionPlan | null {
  const common = { pick: leg.chain };
  let best: DimensionPlan | null = null;
  let least = CLASH;
  for (const face of ['upper', 'lower'] as const) {
    const [a, b] = measured(stretch, face, leg.setback).map(view.place) as [Point, Point];
    const [across] = measured(stretch, face === 'upper' ? 'lower' : 'upper', leg.setback);
    const outward = direction(view.place(across), a);
    const beyond = frames.stretches.length > FEW_LEGS ? [] : outsideOffsets(frames, view, a, outward);
    [...OFFSETS, ...beyond].forEach((offset, level) => {
      for (const [rank, figure] of FIGURES.entries()) {
        const base = level * 10 + (face === outer ? 0 : 14) + rank * 2;
        if (base >= least) continue;
        const plan = planDimension(a, b, outward, offset, text, figure, common);
        if (!plan) continue;
        const cost = base + clearance.cost(plan.footprint);
        if (cost >= least) continue;
        least = cost;
        best = plan;
      }
    });
  }
  return best;
}

/** From a measured point to past everything that lies on that side. */
function outsideOffsets(frames: Frames, view: View, foot: Point, outward: Point): number[] {
  const reach = (['lower', 'upper'] as const).flatMap((face) =>
    facePoints(frames, face).map((point) => {
      const { x, y } = view.place(point);
      return (x - foot.x) * outward.x + (y - foot.y) * outward.y;
    }),
  );
  const past = Math.max(...reach);
  return past < 10 ? [] : OUTSIDE.map((more) => past + more);
}

/** Where the dimension begins and ends, on a face extended: the tangent line, and beyond it by the setback. */
function measured(stretch: Stretch, face: Face, [before, after]: readonly [number, number]): [Point, Point] {
  const [start, end] = stretch[face];
  const way = headingOf(stretch.heading);
  return [along(start, way, -before), along(end, way, after)];
}

/** The face away from the rest of the part. */
function outerFace(frames: Frames, index: number): Face {
  const before = frames.curves[index - 1]?.sense ?? 0;
  const after = frames.curves[index]?.sense ?? 0;
  return before + after < 0 ? 'upper' : 'lower';
}
