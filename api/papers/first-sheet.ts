import { drawBlank } from './blank-drawing';
import type { BlankPaperInput } from './blank-paper-input';
import { planBlank } from './blank-plan';
import { bandColumns, drawBand } from './first-sheet-band';
import { inOrder } from './findings-list';
import { text, wrap } from './lettering';
import { PAPERS, TYPE, frameOf } from './paper-size';
import { FRAME, RULE } from './pens';
import { line, rectangle } from './sheet';
import type { Box, Mark, Sheet } from './sheet';
import { TITLE_BLOCK_HEIGHT, titleBlock } from './title-block';
import type { SheetNumber } from './title-block';

const INSET = 4;

/** The drawing of the blank, over the band of pictures and words, over the title block. */
export function firstSheet(input: BlankPaperInput, number: SheetNumber, findingsSheet: number | null): Sheet {
  const frame = frameOf(input.size);
  const titleTop = frame.y + frame.height - TITLE_BLOCK_HEIGHT;
  const columns = bandColumns(input.result, frame, titleTop);
  const band = columns.box;
  const area: Box = {
    x: frame.x + INSET,
    y: frame.y + INSET,
    width: frame.width - 2 * INSET,
    height: band.y - frame.y - INSET - 2,
  };
  const plan = planBlank(input, area);
  const marks: Mark[] = [
    rectangle(frame, FRAME),
    ...(plan ? drawBlank(input, plan, area) : noBlank(input, area)),
    line(band.x, band.y, band.x + band.width, band.y, RULE),
    ...drawBand(input.result, columns, findingsSheet),
    ...titleBlock(input, { ...frame, y: titleTop, height: TITLE_BLOCK_HEIGHT }, plan?.scale.text ?? 'none', number),
  ];
  const { width, height } = PAPERS[input.size];
  return { width, height, marks };
}

/** Instead of a drawing: that there is none, and what stopped it. */
function noBlank({ result }: BlankPaperInput, area: Box): Mark[] {
  const stops = inOrder(result.findings).filter(({ level }) => level === 'stop');
  const lines = stops.flatMap(({ message }) => wrap(`stop: ${message}`, area.width - 20, TYPE.station, 4));
  return [
    text('The blank has no figure and is not drawn.', area.x + 10, area.y + 16, { size: 6, weight: 'semibold' }),
    ...lines
      .slice(0, 14)
      .map((words, index) =>
        text(words, area.x + 10, area.y + 28 + index * TYPE.station * 1.4, { size: TYPE.station }),
      ),
  ];
}
