import { lineName } from '../../shared/part/words';
import type { Solved } from '../../shared/result';
import { formatAngle } from '../../shared/units/format';
import { lengthFigure, NO_FIGURE } from './figures';
import type { SheetFlow } from './sheet-flow';
import { drawTable } from './table';
import type { Column } from './table';

const JOGGLES: readonly Column[] = [
  { head: ['joggle'], width: 18 },
  { head: ['lines'], width: 'rest' },
  { head: ['depth, face to same face'], width: 44, align: 'right' },
  { head: ['run, between outer tangent lines'], width: 54, align: 'right' },
  { head: ['bend angle'], width: 30, align: 'right' },
  { head: ['straight between'], width: 36, align: 'right' },
];

/** A joggle is two bends of the schedule; what it is measured by stands here. */
export function drawJoggles(flow: SheetFlow, { joggles, unit }: Solved): void {
  if (joggles.length === 0) return;
  const rows = joggles.map(({ bends, offset, run, angle, straight }, index) => [
    { lines: [String(index + 1)], weight: 'semibold' as const },
    {
      lines: [
        bends === null ? 'none' : `${lineName(bends[0])} and ${lineName(bends[1])}, in one die or one after the other`,
      ],
    },
    { lines: [lengthFigure(offset, unit)] },
    { lines: [lengthFigure(run, unit)] },
    { lines: [angle === null ? NO_FIGURE : formatAngle(angle)] },
    { lines: [lengthFigure(straight, unit)] },
  ]);
  drawTable(flow, 'Joggles', JOGGLES, rows);
}
