import type { BlankPaperInput } from './blank-paper-input';
import { drawBendNotes } from './bend-notes';
import { blankHeading } from './blank-heading';
import { blankLines, breakBand, holeMarks } from './blank-lines';
import { DIMENSION_ROW, SENTENCE_LINE } from './blank-plan';
import type { BlankPlan } from './blank-plan';
import { dimensionAcross, dimensionAlong } from './dimension';
import { lengthFigure } from './figures';
import { legLabels } from './leg-labels';
import { text } from './lettering';
import { TYPE } from './paper-size';
import { drawRunningDimensions } from './running-dimensions';
import type { Box, Mark } from './sheet';

/** Where the width is cut out, measured down the drawn blank: low, so that leg names keep their room. */
const BREAK_AT = 0.8;

/** The dimensioned blank in its area. */
export function drawBlank(input: BlankPaperInput, plan: BlankPlan, area: Box): Mark[] {
  const { result } = input;
  const { view } = plan;
  const broken = view.across === 'broken' || view.across === 'unknown';
  const breakAt = view.top + (view.bottom - view.top) * BREAK_AT;
  const holes = holeMarks(result, plan);
  return [
    ...blankHeading(area, plan.scale.text, input),
    ...blankLines(result, plan),
    ...(broken ? breakBand(plan, breakAt) : []),
    ...holes.marks,
    ...drawRunningDimensions(plan.stations, view),
    ...drawBendNotes(plan.notes, view),
    ...overall(input, plan),
    ...endNames(plan, broken ? (view.top + breakAt) / 2 : (view.top + view.bottom) / 2),
    ...legLabels(result, view, broken ? breakAt - 3 : view.bottom, holes.boxes),
    ...plan.sentences.map((sentence, index) =>
      text(sentence, area.x, area.y + area.height - (plan.sentences.length - 1 - index) * SENTENCE_LINE - 0.8, {
        size: TYPE.small,
      }),
    ),
  ];
}

function overall({ result }: BlankPaperInput, { view, notes, length }: BlankPlan): Mark[] {
  const { unit, blank } = result;
  const first = view.bottom + notes.height + DIMENSION_ROW - 1;
  const marks = dimensionAlong({
    from: view.left,
    to: view.right,
    edge: view.bottom,
    at: first,
    words: `net ${lengthFigure(length, unit)}`,
  });
  if (blank.roughLength !== null && blank.trim.start + blank.trim.end > 0) {
    const words = `rough ${lengthFigure(blank.roughLength, unit)}`;
    marks.push(
      ...dimensionAlong({
        from: view.roughLeft,
        to: view.roughRight,
        edge: view.bottom,
        at: first + DIMENSION_ROW,
        words,
      }),
    );
  }
  const words = blank.width === null ? 'not stated' : lengthFigure(blank.width, unit);
  const at = view.roughRight + 18;
  return [...marks, ...dimensionAcross({ from: view.top, to: view.bottom, edge: view.roughRight, at, words })];
}

/** The ends by name, as they are marked on the metal. */
function endNames({ view }: BlankPlan, middle: number): Mark[] {
  const how = { size: TYPE.body, weight: 'semibold' } as const;
  return [
    text('datum', view.roughLeft - 3, middle - 0.4, { ...how, align: 'right', clear: true }),
    text('end', view.roughLeft - 3, middle + 3, { ...how, align: 'right', clear: true }),
    text('far', view.roughRight + 3, middle - 0.4, { ...how, clear: true }),
    text('end', view.roughRight + 3, middle + 3, { ...how, clear: true }),
  ];
}
