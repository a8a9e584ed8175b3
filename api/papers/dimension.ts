import { TYPE } from './paper-size';
import { THIN } from './pens';
import { line } from './sheet';
import type { Mark, Point, ShapeMark } from './sheet';
import { extentOf, text, widthOf } from './lettering';

const LENGTH = 2.6;
const HALF_WIDTH = 0.45;

/** A filled arrowhead with its point at `tip`, looking along (dx, dy), a unit vector along an axis. */
export function arrowhead(tip: Point, dx: number, dy: number): ShapeMark {
  const back = { x: tip.x - dx * LENGTH, y: tip.y - dy * LENGTH };
  return {
    kind: 'shape',
    points: [
      tip,
      { x: back.x - dy * HALF_WIDTH, y: back.y + dx * HALF_WIDTH },
      { x: back.x + dy * HALF_WIDTH, y: back.y - dx * HALF_WIDTH },
    ],
    pen: null,
    fill: THIN.shade,
  };
}

export interface Measured {
  readonly from: number;
  readonly to: number;
  /** Where the edges measured end and the dimension line lies, square to the measured way. */
  readonly edge: number;
  readonly at: number;
  readonly words: string;
  readonly size?: number;
}

const GAP = 1;
const BEYOND = 1.5;

/** A dimension along x under (or over) its edge, with its figure upon the line. */
export function dimensionAlong({ from, to, edge, at, words, size = TYPE.station }: Measured): Mark[] {
  const away = Math.sign(at - edge);
  const marks: Mark[] = [from, to].map((x) => line(x, edge + away * GAP, x, at + away * BEYOND, THIN));
  const inside = to - from >= widthOf(words, size, 'semibold') + 2 * LENGTH;
  const outside = to - from < 3 * LENGTH;
  const reach = outside ? LENGTH * 2 : 0;
  marks.push(line(from - reach, at, to + reach, at, THIN));
  marks.push(arrowhead({ x: from, y: at }, outside ? 1 : -1, 0), arrowhead({ x: to, y: at }, outside ? -1 : 1, 0));
  const place = inside
    ? ({ x: (from + to) / 2, align: 'centre' } as const)
    : ({ x: to + reach + 1, align: 'left' } as const);
  marks.push(
    text(words, place.x, at - 0.8 - extentOf(words, size, 'semibold').below, {
      size,
      weight: 'semibold',
      align: place.align,
      clear: true,
    }),
  );
  return marks;
}

/** A dimension along y beside its edge, read from the bottom up. */
export function dimensionAcross({ from, to, edge, at, words, size = TYPE.station }: Measured): Mark[] {
  const away = Math.sign(at - edge);
  const marks: Mark[] = [from, to].map((y) => line(edge + away * GAP, y, at + away * BEYOND, y, THIN));
  const outside = to - from < 3 * LENGTH;
  const reach = outside ? LENGTH * 2 : 0;
  marks.push(line(at, from - reach, at, to + reach, THIN));
  marks.push(arrowhead({ x: at, y: from }, 0, outside ? 1 : -1), arrowhead({ x: at, y: to }, 0, outside ? -1 : 1));
  const inside = to - from >= widthOf(words, size, 'semibold') + 2 * LENGTH;
  // Too short for its figure upright along the line: beside it, read level.
  marks.push(
    inside
      ? text(words, at - 0.8 - extentOf(words, size, 'semibold').below, (from + to) / 2, {
          size,
          weight: 'semibold',
          align: 'centre',
          upward: true,
          clear: true,
        })
      : text(words, at + 1.5, (from + to) / 2 + size * 0.35, { size, weight: 'semibold', clear: true }),
  );
  return marks;
}
