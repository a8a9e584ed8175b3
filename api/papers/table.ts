import { text } from './lettering';
import type { Lettering } from './lettering';
import { TYPE } from './paper-size';
import { FRAME, QUIET, RULE } from './pens';
import { line } from './sheet';
import type { Weight } from './sheet';
import type { SheetFlow } from './sheet-flow';

export interface Column {
  readonly head: readonly string[];
  /** Width in mm; one column may take what is left. */
  readonly width: number | 'rest';
  readonly align?: 'left' | 'right';
}

export interface Cell {
  readonly lines: readonly string[];
  /** Weight of the first line; the lines under it are quiet. */
  readonly weight?: Weight;
  /** All lines alike: a wrapped text, not a figure with its translations. */
  readonly even?: boolean;
}

const SIZE = TYPE.body;
const LEADING = SIZE * 1.24;
const PAD = 1.3;
const SIDE = 1.2;

export function columnWidths(columns: readonly Column[], total: number): number[] {
  const fixed = columns.reduce((sum, { width }) => sum + (width === 'rest' ? 0 : width), 0);
  return columns.map(({ width }) => (width === 'rest' ? total - fixed : width));
}

/** Room for words in a column. */
export const cellRoom = (width: number): number => width - 2 * SIDE;

/** A table that goes on over as many sheets as it needs, its head on each; gives the sheet of the flow it begins on. */
export function drawTable(
  flow: SheetFlow,
  title: string,
  columns: readonly Column[],
  rows: readonly (readonly Cell[])[],
): number {
  const widths = columnWidths(columns, flow.area.width);
  const headHeight = Math.max(...columns.map(({ head }) => head.length)) * LEADING + 2 * PAD;
  const heightOf = (row: readonly Cell[]): number =>
    Math.max(1, ...row.map(({ lines }) => lines.length)) * LEADING + 2 * PAD;
  const drawHead = (words: string): void => {
    flow.heading(words, headHeight + (rows[0] ? heightOf(rows[0]) : 0));
    const { y } = flow.take(headHeight);
    const cells = columns.map(({ head }) => ({ lines: head, even: true }));
    drawRow(flow, columns, widths, cells, y, { size: TYPE.small, shade: QUIET });
    flow.add(line(flow.area.x, y + headHeight, flow.area.x + flow.area.width, y + headHeight, FRAME));
  };
  drawHead(title);
  const begun = flow.current;
  for (const row of rows) {
    const height = heightOf(row);
    if (!flow.fits(height)) drawHead(`${title}, continued`);
    const { y } = flow.take(height);
    drawRow(flow, columns, widths, row, y, { size: SIZE });
    flow.add(line(flow.area.x, y + height, flow.area.x + flow.area.width, y + height, RULE));
  }
  return begun;
}

function drawRow(
  flow: SheetFlow,
  columns: readonly Column[],
  widths: readonly number[],
  cells: readonly Cell[],
  top: number,
  how: Lettering,
): void {
  let x = flow.area.x;
  columns.forEach(({ align = 'left' }, index) => {
    const width = widths[index] ?? 0;
    const cell = cells[index];
    const at = align === 'right' ? x + width - SIDE : x + SIDE;
    cell?.lines.forEach((words, row) => {
      const quiet = row > 0 && !cell.even;
      const weight = row === 0 || cell.even ? (cell.weight ?? 'regular') : 'regular';
      const shade = quiet ? QUIET : (how.shade ?? 0);
      const size = quiet ? TYPE.small : how.size;
      flow.add(text(words, at, top + PAD + row * LEADING + SIZE * 0.8, { size, weight, shade, align }));
    });
    x += width;
  });
}
