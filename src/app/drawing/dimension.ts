/** One linear dimension by drafting practice: extension lines with a gap, filled arrowheads, the figure upright. */
import type { Footprint } from './clearance';
import type { Common, Mark } from './marks';
import { at, linePath, textBox, textWidth, TEXT_SIZE } from './marks';
import type { Point, Segment } from './point';
import { along, direction, distance, middle } from './point';

/** Between the measured point and the start of its extension line: clear of the cross that marks a mold point. */
const GAP = 7;
/** How far an extension line runs past its dimension line. */
const OVER = 5;
const ARROW = 9;
const ARROW_HALF = 1.8;
/** Length of the line outside the extension lines when the arrows point inwards. */
const TAIL = 18;

export type FigurePlace = 'between' | 'past-start' | 'past-end';

export interface DimensionPlan {
  /** Made only for the plan that is chosen among many. */
  readonly marks: () => readonly Mark[];
  readonly footprint: Footprint;
}

/**
 * @param from @param to what is measured, on the metal
 * @param outward unit vector square to it, to the side where the dimension line lies
 * @param offset from the measured points to the dimension line
 * @returns null when the figure does not fit where it was asked for
 */
export function planDimension(
  from: Point,
  to: Point,
  outward: Point,
  offset: number,
  text: string,
  figure: FigurePlace,
  common: Common,
): DimensionPlan | null {
  const a = along(from, outward, offset);
  const b = along(to, outward, offset);
  const u = direction(a, b);
  const length = distance(a, b);
  const width = textWidth(text, 'figure');
  // The line breaks for the upright figure: as wide as the line needs to pass clear of it.
  const half = Math.min(
    (width / 2 + 4) / Math.max(Math.abs(u.x), 1e-6),
    (TEXT_SIZE.figure / 2 + 3) / Math.max(Math.abs(u.y), 1e-6),
  );
  const fits = length >= 2 * (half + ARROW + 3);
  if (fits !== (figure === 'between')) return null;
  const thin = [from, to].map((foot): Segment => {
    const reach = Math.max(offset + OVER, GAP + 1);
    return { from: along(foot, outward, GAP), to: along(foot, outward, reach) };
  });
  const role = 'figure' as const;
  let lines: Segment[];
  let heads: () => string[];
  let centre: Point;
  if (figure === 'between') {
    centre = middle(a, b);
    lines = [
      { from: a, to: along(centre, u, -half) },
      { from: along(centre, u, half), to: b },
    ];
    heads = () => [arrow(a, u), arrow(b, { x: -u.x, y: -u.y })];
  } else {
    centre = figure === 'past-start' ? along(a, u, -(TAIL + half)) : along(b, u, TAIL + half);
    lines = [{ from: along(a, u, -TAIL), to: along(b, u, TAIL) }];
    heads = () => [arrow(a, { x: -u.x, y: -u.y }), arrow(b, u)];
  }
  const figureMark = { kind: 'text', role, text, at: centre, anchor: 'middle', ...common } as const;
  const path = (): string => [...thin, ...lines].map((line) => linePath(line.from, line.to)).join('');
  return {
    marks: () => [
      { kind: 'path', role: 'dimension', d: path(), ...common },
      { kind: 'path', role: 'arrow', d: heads().join(''), ...common },
      figureMark,
    ],
    footprint: { texts: [textBox(figureMark)], lines, thin },
  };
}

/** A filled arrowhead with its tip at `tip`, pointing against `back`. */
export function arrow(tip: Point, back: Point): string {
  const base = along(tip, back, ARROW);
  const square = { x: -back.y, y: back.x };
  return `M${at(tip)}L${at(along(base, square, ARROW_HALF))}L${at(along(base, square, -ARROW_HALF))}Z`;
}
