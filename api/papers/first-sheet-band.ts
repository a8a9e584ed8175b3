import { lineName } from '../../shared/part/words';
import type { Solved } from '../../shared/result';
import { CAUTIONS } from './cautions';
import { drawEnlargedLines, firstLine } from './enlarged-lines';
import { summarise } from './findings-list';
import { drawFormed } from './formed-picture';
import { text, wrap } from './lettering';
import { TYPE } from './paper-size';
import { RULE } from './pens';
import { line } from './sheet';
import type { Box, Mark } from './sheet';

/** Deep enough for the pictures; the cautions may need more. */
const LEAST_DEPTH = 34;
const INSET = 4;
const HEAD = 9.4;
const LEADING = TYPE.small * 1.28;

export interface BandColumns {
  readonly box: Box;
  readonly formed: Box;
  /** Left out when no bend has its lines. */
  readonly enlarged: Box | null;
  readonly findings: Box;
  readonly cautions: Box;
  readonly warned: readonly string[];
}

/** The band between the drawing and the title block: formed section, the lines of a bend, findings, cautions. */
export function bandColumns(result: Solved, frame: Box, bottom: number): BandColumns {
  const [formed, enlarged, findings, cautions] =
    firstLine(result) === null ? [0.28, 0, 0.36, 0.36] : [0.22, 0.17, 0.3, 0.31];
  const warned = CAUTIONS.flatMap((words) => wrap(words, frame.width * (cautions ?? 0) - 2 * INSET, TYPE.small));
  const height = Math.max(LEAST_DEPTH, HEAD + warned.length * LEADING);
  let x = frame.x;
  const column = (share = 0): Box => {
    const width = frame.width * share;
    x += width;
    return { x: x - width, y: bottom - height, width, height };
  };
  const first = column(formed);
  const second = column(enlarged);
  return {
    box: { ...frame, y: bottom - height, height },
    formed: first,
    enlarged: second.width > 0 ? second : null,
    findings: column(findings),
    cautions: column(cautions),
    warned,
  };
}

/** Fills the band; `findingsSheet` is where the findings are listed in full. */
export function drawBand(result: Solved, columns: BandColumns, findingsSheet: number | null): Mark[] {
  const { box, formed, enlarged, findings, cautions, warned } = columns;
  const most = Math.floor((box.height - HEAD + 1) / LEADING);
  const { head, lines } = summarise(result, findings.width - 2 * INSET, most, findingsSheet);
  return [
    ...heading('Formed section', formed),
    ...drawFormed(result, { x: formed.x + 1, y: box.y + 6, width: formed.width - 2, height: box.height - 7 }),
    ...(enlarged ? enlargedColumn(result, enlarged) : []),
    divider(findings),
    ...heading(`Findings: ${head}`, findings),
    ...paragraph(lines, findings),
    divider(cautions),
    ...heading('Cautions', cautions),
    ...paragraph(warned, cautions),
  ];
}

const enlargedColumn = (result: Solved, box: Box): Mark[] => [
  divider(box),
  ...heading(`Lines of ${lineName(firstLine(result) ?? 0)}, enlarged`, box),
  ...drawEnlargedLines(result, {
    x: box.x + INSET,
    y: box.y + 6.5,
    width: box.width - 2 * INSET,
    height: box.height - 9,
  }),
];

const divider = (box: Box): Mark => line(box.x, box.y, box.x, box.y + box.height, RULE);

const heading = (words: string, box: Box): Mark[] => [
  text(words, box.x + INSET, box.y + 5, { size: TYPE.body, weight: 'semibold' }),
];

const paragraph = (lines: readonly string[], box: Box): Mark[] =>
  lines.map((words, index) => text(words, box.x + INSET, box.y + HEAD + index * LEADING, { size: TYPE.small }));
