import { MM_PER_INCH } from '../../shared/units/length';
import type { Solved } from '../../shared/result';
import type { BlankPlan } from './blank-plan';
import {
  BEND_LINE,
  CENTRE,
  FRAME,
  NET_EDGE,
  OUTLINE,
  SIGHT_DATUM_SIDE,
  SIGHT_FAR_SIDE,
  TANGENT_LINE,
  THIN,
} from './pens';
import { line, rectangle } from './sheet';
import type { Box, CircleMark, Mark, Pen, Point, ShapeMark } from './sheet';

/** How far each sight line reaches in from its edge: never beside the other one, which may lie a hair away. */
const SIGHT_REACH = 0.44;

/** Edges, tangent lines, bend lines and sight lines of the blank. */
export function blankLines(result: Solved, { view, length }: BlankPlan): Mark[] {
  const { top, bottom, x } = view;
  const deep = bottom - top;
  const full = (station: number, pen: Pen): Mark => line(x(station), top, x(station), bottom, pen);
  const marks: Mark[] = [];
  for (const { tangentStart, centre, tangentEnd, sightLine } of result.bends) {
    if (tangentStart === null || centre === null || tangentEnd === null) continue;
    marks.push(full(tangentStart, TANGENT_LINE), full(tangentEnd, TANGENT_LINE), full(centre, BEND_LINE));
    if (sightLine === null) continue;
    const datum = x(sightLine.startUnderNose);
    const far = x(sightLine.endUnderNose);
    marks.push(line(datum, bottom, datum, bottom - deep * SIGHT_REACH, SIGHT_DATUM_SIDE));
    marks.push(line(far, top, far, top + deep * SIGHT_REACH, SIGHT_FAR_SIDE));
  }
  const { start, end } = result.blank.trim;
  if (start > 0) marks.push(full(0, NET_EDGE));
  if (end > 0) marks.push(full(length, NET_EDGE));
  marks.push(rectangle({ x: view.roughLeft, y: top, width: view.roughRight - view.roughLeft, height: deep }, OUTLINE));
  return marks;
}

/** A band of bare paper between two zigzag lines, where a piece of the width is left out. */
export function breakBand({ view }: BlankPlan, at: number): Mark[] {
  const zigzag = (y: number): Point[] => {
    const from = view.roughLeft - 2.5;
    const to = view.roughRight + 2.5;
    const middle = (from + to) / 2;
    return [
      { x: from, y },
      { x: middle - 2.4, y },
      { x: middle - 0.8, y: y - 2 },
      { x: middle + 0.8, y: y + 2 },
      { x: middle + 2.4, y },
      { x: to, y },
    ];
  };
  const upper = zigzag(at - 0.9);
  const lower = zigzag(at + 0.9);
  const band: ShapeMark = { kind: 'shape', points: [...upper, ...[...lower].reverse()], pen: null, fill: 1 };
  const edges = [upper, lower].flatMap((points) =>
    points.slice(1).map((to, index) => {
      const from = points[index] ?? to;
      return line(from.x, from.y, to.x, to.y, THIN);
    }),
  );
  return [band, ...edges];
}

/** Holes with their centre lines, where they lie on the drawn blank. Across runs up from the lower left corner. */
export function holeMarks(result: Solved, { view, scale }: BlankPlan): { marks: Mark[]; boxes: Box[] } {
  if (view.across !== 'true') return { marks: [], boxes: [] };
  const perUnit = (result.unit === 'in' ? MM_PER_INCH : 1) * scale.factor;
  const marks: Mark[] = [];
  const boxes: Box[] = [];
  for (const { station, across, diameter } of result.holes) {
    if (station === null) continue;
    const centre = { x: view.x(station), y: view.bottom - across * perUnit };
    const radius = (diameter * perUnit) / 2;
    const arm = radius + 1.2;
    const circle: CircleMark = { kind: 'circle', centre, radius, pen: FRAME, fill: null };
    marks.push(
      circle,
      line(centre.x - arm, centre.y, centre.x + arm, centre.y, CENTRE),
      line(centre.x, centre.y - arm, centre.x, centre.y + arm, CENTRE),
    );
    boxes.push({ x: centre.x - arm, y: centre.y - arm, width: 2 * arm, height: 2 * arm });
  }
  return { marks, boxes };
}
