import { MM_PER_INCH } from '../../shared/units/length';
import { bendNoteWays } from './bend-notes';
import type { BendNotes } from './bend-notes';
import type { BlankPaperInput } from './blank-paper-input';
import { blankSentences } from './blank-sentences';
import type { Across, BlankView } from './blank-view';
import { wrap } from './lettering';
import { TYPE } from './paper-size';
import { planRunningDimensions } from './running-dimensions';
import type { RunningDimensions } from './running-dimensions';
import { largestScale } from './scale';
import type { Scale } from './scale';
import type { Box } from './sheet';

export interface BlankPlan {
  readonly view: BlankView;
  readonly scale: Scale;
  readonly stations: RunningDimensions;
  readonly notes: BendNotes;
  readonly sentences: readonly string[];
  /** Net length, in the part's unit. */
  readonly length: number;
}

/** Room for the words and dimensions beside the blank, and for the two rows over it. */
const LEFT_GUTTER = 16;
const RIGHT_GUTTER = 28;
const HEADING = 13;
export const DIMENSION_ROW = 7.5;
export const SENTENCE_LINE = TYPE.small * 1.35;
/** Narrower than this a blank can't be read; deeper than the other a cut-out one is only empty. */
const LEAST_ACROSS = 12;
const NOMINAL_ACROSS = 18;
const BROKEN_ACROSS = 52;
/** A true drawing may be this much shorter than the room before the width is cut out instead. */
const SHORTEST_TRUE = 0.4;

/** Finds scale, place and labels of the blank in an area; null when the blank has no length. */
export function planBlank(input: BlankPaperInput, area: Box): BlankPlan | null {
  const { blank, unit } = input.result;
  const length = blank.length;
  if (length === null || !(length > 0)) return null;
  const perUnit = unit === 'in' ? MM_PER_INCH : 1;
  const room = area.width - LEFT_GUTTER - RIGHT_GUTTER;
  const rough = (length + blank.trim.start + blank.trim.end) * perUnit;
  const across = blank.width === null ? null : blank.width * perUnit;

  const largest = largestScale(rough, room);
  if (across === null) return place(input, area, length, largest, 'unknown', BROKEN_ACROSS, Infinity);
  let scale = largest;
  while (rough * scale.factor >= room * SHORTEST_TRUE || scale === largest) {
    const onPaper = across * scale.factor;
    if (onPaper < LEAST_ACROSS) break;
    const plan = place(input, area, length, scale, 'true', onPaper, onPaper);
    if (plan.view.bottom - plan.view.top >= onPaper - 1e-9) return plan;
    scale = largestScale(rough, rough * scale.factor * 0.99);
  }
  return across * largest.factor < LEAST_ACROSS
    ? place(input, area, length, largest, 'nominal', NOMINAL_ACROSS, NOMINAL_ACROSS)
    : place(input, area, length, largest, 'broken', BROKEN_ACROSS, across * largest.factor);
}

/** Lays the blank out at one scale, as deep across as is wanted and the labels leave room for. */
function place(
  input: BlankPaperInput,
  area: Box,
  length: number,
  scale: Scale,
  across: Across,
  wanted: number,
  most: number,
): BlankPlan {
  const { blank, unit } = input.result;
  const perUnit = (unit === 'in' ? MM_PER_INCH : 1) * scale.factor;
  const room = area.width - LEFT_GUTTER - RIGHT_GUTTER;
  const rough = (length + blank.trim.start + blank.trim.end) * perUnit;
  const roughLeft = area.x + LEFT_GUTTER + (room - rough) / 2;
  const left = roughLeft + blank.trim.start * perUnit;
  const along = {
    x: (station: number): number => left + station * perUnit,
    left,
    right: left + length * perUnit,
    roughLeft,
    roughRight: roughLeft + rough,
    low: area.x,
    high: area.x + area.width,
    across,
  };
  const stations = planRunningDimensions(input.result, length, along);
  const rows = blank.trim.start + blank.trim.end > 0 ? 2 : 1;
  const ways = bendNoteWays(input.result, along).map((notes) => {
    const sentences = wrap(
      blankSentences(input, across, stations.shown, notes.style).join(' '),
      area.width,
      TYPE.small,
    );

    const taken =
      HEADING + stations.height + notes.height + rows * DIMENSION_ROW + 2 + sentences.length * SENTENCE_LINE;
    return { notes, sentences, left: area.height - taken };
  });
  const enough = Math.min(wanted, NOMINAL_ACROSS);
  const way = ways.find(({ left: free }) => free >= enough) ?? ways.at(-1);
  if (!way) throw new Error('there is always a way to leave the notes out');
  const deep = Math.min(wanted, most, way.left);
  const top = area.y + HEADING + stations.height + Math.max(0, way.left - deep) / 2;
  return {
    view: { ...along, top, bottom: top + deep },
    scale,
    stations,
    notes: way.notes,
    sentences: way.sentences,
    length,
  };
}
