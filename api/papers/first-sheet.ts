import { drawBlank } from './blank-drawing';
import type { BlankPaperInput } from './blank-paper-input';
import { planBlank } from './blank-plan';
import { CAUTIONS } from './cautions';
import { inOrder, summarise } from './findings-list';
import { drawFormed } from './formed-picture';
import { text, wrap } from './lettering';
import { PAPERS, TYPE, frameOf } from './paper-size';
import { FRAME, RULE } from './pens';
import { line, rectangle } from './sheet';
import type { Box, Mark, Sheet } from './sheet';
import { TITLE_BLOCK_HEIGHT, titleBlock } from './title-block';
import type { SheetNumber } from './title-block';

const BAND_HEIGHT = 38;
const INSET = 4;
const LEADING = TYPE.small * 1.3;

/** The drawing of the blank over a band with the formed section, the findings and the cautions, over the title block. */
export function firstSheet(input: BlankPaperInput, number: SheetNumber, findingsSheet: number | null): Sheet {
  const frame = frameOf(input.size);
  const titleTop = frame.y + frame.height - TITLE_BLOCK_HEIGHT;
  const band: Box = { ...frame, y: titleTop - BAND_HEIGHT, height: BAND_HEIGHT };
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
    ...bandMarks(input, band, findingsSheet),
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

function bandMarks(input: BlankPaperInput, band: Box, findingsSheet: number | null): Mark[] {
  const shares = [0.28, 0.36, 0.36];
  const boxes = shares.map((share, index): Box => {
    const before = shares.slice(0, index).reduce((sum, part) => sum + part, 0);
    return { x: band.x + band.width * before, y: band.y, width: band.width * share, height: band.height };
  });
  const [picture, findings, cautions] = boxes;
  if (!picture || !findings || !cautions) return [];
  const most = Math.floor((band.height - 9) / LEADING);
  const room = findings.width - 2 * INSET;
  const { head, lines } = summarise(input.result, room, most, findingsSheet);
  const warned = CAUTIONS.flatMap((caution) => wrap(caution, cautions.width - 2 * INSET, TYPE.small));
  return [
    ...heading('Formed section', picture),
    ...drawFormed(input.result, {
      x: picture.x + 2,
      y: band.y + 6,
      width: picture.width - 4,
      height: band.height - 7.5,
    }),
    line(findings.x, band.y, findings.x, band.y + band.height, RULE),
    ...heading(`Findings: ${head}`, findings),
    ...paragraph(lines, findings),
    line(cautions.x, band.y, cautions.x, band.y + band.height, RULE),
    ...heading('Cautions', cautions),
    ...paragraph(warned, cautions),
  ];
}

const heading = (words: string, box: Box): Mark[] => [
  text(words, box.x + INSET, box.y + 5, { size: TYPE.body, weight: 'semibold' }),
];

const paragraph = (lines: readonly string[], box: Box): Mark[] =>
  lines.map((words, index) => text(words, box.x + INSET, box.y + 9.4 + index * LEADING, { size: TYPE.small }));
