import type { BlankPaperInput } from './blank-paper-input';
import { drawFindings } from './findings-list';
import { firstSheet } from './first-sheet';
import { drawHoles, drawLegs } from './leg-and-hole-tables';
import { text } from './lettering';
import { drawJoggles } from './joggle-table';
import { drawLineSchedule } from './line-schedule';
import { PAPERS, TYPE, frameOf } from './paper-size';
import { FRAME } from './pens';
import { rectangle } from './sheet';
import type { Box, Paper, Sheet } from './sheet';
import { SheetFlow } from './sheet-flow';
import { TITLE_STRIP_HEIGHT, titleStrip } from './title-block';

const INSET = 4;

/** The whole paper as plain data: the drawing first, then schedule, legs, holes and findings on as many sheets as they need. */
export function layOutBlankPaper(input: BlankPaperInput): Paper {
  const frame = frameOf(input.size);
  const { width, height } = PAPERS[input.size];
  const area: Box = {
    x: frame.x + INSET,
    y: frame.y + INSET,
    width: frame.width - 2 * INSET,
    height: frame.height - TITLE_STRIP_HEIGHT - 2 * INSET,
  };
  const flow = new SheetFlow(() => ({ width, height, marks: [rectangle(frame, FRAME)] }), area);
  if (input.result.bends.length > 0) drawLineSchedule(flow, input.result);
  else flatStrip(flow);
  drawJoggles(flow, input.result);
  drawLegs(flow, input.result);
  drawHoles(flow, input.result, input.document);
  const findingsFrom = drawFindings(flow, input.result);

  const of = flow.sheets.length + 1;
  const strip: Box = { ...frame, y: frame.y + frame.height - TITLE_STRIP_HEIGHT, height: TITLE_STRIP_HEIGHT };
  flow.sheets.forEach((sheet, index) => sheet.marks.push(...titleStrip(input, strip, { sheet: index + 2, of })));
  const first = firstSheet(input, { sheet: 1, of }, findingsFrom === null ? null : findingsFrom + 1);
  const sheets: Sheet[] = [first, ...flow.sheets];
  if (input.revision.state !== 'released') {
    for (const sheet of sheets) sheet.marks.push({ kind: 'watermark', text: 'NOT RELEASED' });
  }
  const { part, revision, issuedAt, issuedBy } = input;
  return { title: `${part.number} ${revision.letter}, blank`, author: issuedBy, issuedAt, sheets };
}

function flatStrip(flow: SheetFlow): void {
  flow.heading('Line schedule', 8);
  const { y } = flow.take(8);
  flow.add(text('No bends: a flat strip.', flow.area.x + 1.2, y + 4, { size: TYPE.body }));
}
