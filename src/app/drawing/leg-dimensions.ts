/** Every leg dimensioned as it is measured, each where it clashes with nothing. */
import type { Solved } from '@shared/result';
import type { Clearance } from './clearance';
import { CLASH } from './clearance';
import type { DimensionPlan, FigurePlace } from './dimension';
import { planDimension } from './dimension';
import type { Frames, Stretch } from './formed-frames';
import { forward, normal } from './formed-frames';
import { facePoints } from './formed-outline';
import type { Mark } from './marks';
import type { Point } from './point';
import { direction } from './point';
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
  selected: number | null,
): LegDimensions {
  const marks: Mark[] = [];
  let left = 0;
  // The long ones first: they have the fewest places to go.
  const order = frames.stretches
    .filter((stretch) => stretch.leg !== null)
    .sort((a, b) => lengthOf(solved, b) - lengthOf(solved, a));
  for (const stretch of order) {
    const plan = bestPlan(solved, frames, stretch, view, clearance, figureOf, selected);
    if (!plan) left += 1;
    else {
      marks.push(...plan.marks);
      clearance.add(plan.footprint);
    }
  }
  return { marks, left };
}

const lengthOf = (solved: Solved, stretch: Stretch): number =>
  stretch.leg === null ? 0 : (solved.legs[stretch.leg]?.dimension ?? 0);

function bestPlan(
  solved: Solved,
  frames: Frames,
  stretch: Stretch,
  view: View,
  clearance: Clearance,
  figureOf: (length: number) => string,
  selected: number | null,
): DimensionPlan | null {
  const leg = stretch.leg === null ? undefined : solved.legs[stretch.leg];
  if (!leg) return null;
  const index = frames.stretches.indexOf(stretch);
  const ends = [measuredEnd(frames, index, 'start', leg.setback[0]), measuredEnd(frames, index, 'end', leg.setback[1])];
  const [from, to] = ends as [Point, Point];
  const text = figureOf(leg.dimension);
  const common = { pick: leg.chain, selected: leg.chain === selected };
  const outer = outerSide(frames, index);
  let best: DimensionPlan | null = null;
  let least = CLASH;
  for (const side of [1, -1] as const) {
    const [a, b] = [onSide(frames, stretch, from, side), onSide(frames, stretch, to, side)];
    const outward = direction(view.place(onSide(frames, stretch, from, -side as 1 | -1)), view.place(a));
    const beyond = frames.stretches.length > FEW_LEGS ? [] : outsideOffsets(frames, view, view.place(a), outward);
    [...OFFSETS, ...beyond].forEach((offset, level) => {
      for (const [rank, figure] of FIGURES.entries()) {
        const base = level * 10 + (side === outer ? 0 : 14) + rank * 2;
        if (base >= least) continue;
        const plan = planDimension(view.place(a), view.place(b), outward, offset, text, figure, common);
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

/** Where the dimension ends, on the lower face extended: the tangent line, and beyond it by the setback. */
function measuredEnd(frames: Frames, index: number, end: 'start' | 'end', setback: number): Point {
  const stretch = frames.stretches[index];
  if (!stretch) return { x: 0, y: 0 };
  const way = forward(stretch.heading);
  const [foot, by] = end === 'start' ? [stretch.start, -setback] : [stretch.end, setback];
  return { x: foot.x + way.x * by, y: foot.y + way.y * by };
}

/** The same place on the upper (1) or lower (−1) face. */
function onSide(frames: Frames, stretch: Stretch, lower: Point, side: 1 | -1): Point {
  if (side === -1) return lower;
  const up = normal(stretch.heading);
  return { x: lower.x + up.x * frames.thickness, y: lower.y + up.y * frames.thickness };
}

/** The side away from the rest of the part. */
function outerSide(frames: Frames, index: number): 1 | -1 {
  const before = frames.curves[index - 1]?.sense ?? 0;
  const after = frames.curves[index]?.sense ?? 0;
  return before + after < 0 ? 1 : -1;
}
