import type { Solved } from '../../shared/result';
import { dimensionGap } from './blank-view';
import type { BlankView } from './blank-view';
import { arrowhead } from './dimension';
import { lengthFigure } from './figures';
import { CAPITAL, text, widthOf } from './lettering';
import { TYPE } from './paper-size';
import { THIN } from './pens';
import { line } from './sheet';
import type { Mark, Weight } from './sheet';
import { farthestMove, spread } from '../../shared/geometry/spread';

interface Label {
  readonly station: number;
  readonly words: string;
  readonly weight: Weight;
}

export type Shown = 'all' | 'centres' | 'ends';

export interface RunningDimensions {
  readonly shown: Shown;
  readonly upward: boolean;
  readonly labels: readonly Label[];
  /** Where each figure goes, mm on the sheet. */
  readonly put: readonly number[];
  /** Room they take above the blank. */
  readonly height: number;
}

const ARROW_ROOM = 3.4;
const JOG = 5.5;
/** Paper between two upward figures, wide when there is room for it. */
const GAPS = [1.7, 1.1, 0.75];
const FARTHEST = 14;

function labelsOf(result: Solved, length: number, shown: Shown): Label[] {
  const label = (station: number, weight: Weight): Label => ({
    station,
    words: lengthFigure(station, result.unit),
    weight,
  });
  const inner = result.bends.flatMap(({ tangentStart, centre, tangentEnd }) => {
    if (tangentStart === null || centre === null || tangentEnd === null || shown === 'ends') return [];
    const middle = label(centre, 'semibold');
    return shown === 'all' ? [label(tangentStart, 'regular'), middle, label(tangentEnd, 'regular')] : [middle];
  });
  return [{ ...label(0, 'semibold'), words: '0' }, ...inner, label(length, 'semibold')];
}

/**
 * Chooses how the stations stand: level when they fit near their lines, else upward; tangent stations go before any
 * centre does, and when not even the centres fit the line schedule alone has them.
 */
export function planRunningDimensions(
  result: Solved,
  length: number,
  view: Pick<BlankView, 'x' | 'low' | 'high'>,
): RunningDimensions {
  for (const shown of ['all', 'centres', 'ends'] as const) {
    const labels = labelsOf(result, length, shown);
    const places = labels.map(({ station }) => view.x(station));
    const widths = labels.map(({ words, weight }) => widthOf(words, TYPE.station, weight));
    const half = (index: number): number => (widths[index] ?? 0) / 2;
    const pitches = widths.slice(1).map((_, index) => half(index) + half(index + 1) + 2.4);
    const level = spread(places, pitches, view.low + half(0), view.high - half(widths.length - 1));
    if (level && farthestMove(places, level) <= FARTHEST) {
      return { shown, upward: false, labels, put: level, height: dimensionGap + JOG + 2 + TYPE.station };
    }
    const capital = TYPE.station * CAPITAL;
    const upward = GAPS.map((gap) => spread(places, capital + gap, view.low + capital, view.high - capital)).find(
      (put) => put !== null,
    );
    if (upward)
      return { shown, upward: true, labels, put: upward, height: dimensionGap + JOG + 2 + Math.max(...widths) };
  }
  throw new Error('two end stations always fit');
}

/** Running dimensions from the datum edge: one line with its origin, arrows at what it measures, figures fanned out above. */
export function drawRunningDimensions(plan: RunningDimensions, view: BlankView): Mark[] {
  const marks: Mark[] = [];
  const level = view.top - dimensionGap + 2;
  const knee = view.top - dimensionGap;
  const foot = knee - JOG;
  const origin = view.x(0);
  marks.push(line(origin, level, view.x(plan.labels.at(-1)?.station ?? 0), level, THIN));
  marks.push({ kind: 'circle', centre: { x: origin, y: level }, radius: 0.7, pen: THIN, fill: 1 });
  let last = origin;
  plan.labels.forEach(({ station, words, weight }, index) => {
    const x = view.x(station);
    const put = plan.put[index] ?? x;
    marks.push(
      line(x, view.top - 1, x, knee, THIN),
      line(x, knee, put, foot, THIN),
      line(put, foot, put, foot - 1, THIN),
    );
    if (index > 0) {
      // Where arrows would run into each other a dot marks the place, as drafting practice has it.
      const room = x - last >= ARROW_ROOM;
      marks.push(
        room
          ? arrowhead({ x, y: level }, 1, 0)
          : { kind: 'circle', centre: { x, y: level }, radius: 0.35, pen: null, fill: THIN.shade },
      );
      last = x;
    }
    marks.push(
      plan.upward
        ? text(words, put + (TYPE.station * CAPITAL) / 2, foot - 1.8, { size: TYPE.station, weight, upward: true })
        : text(words, put, foot - 1.8, { size: TYPE.station, weight, align: 'centre' }),
    );
  });
  return marks;
}
