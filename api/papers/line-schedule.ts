import type { Unit } from '../../shared/part/document';
import { METHOD_WORDS } from '../../shared/part/allowance-words';
import { UNIT_WORDS, between, faceUp, lineName } from '../../shared/part/words';
import type { BendResult, Solved } from '../../shared/result';
import { formatAngle, formatLength } from '../../shared/units/format';
import { exactFigure, lengthFigure, otherUnit, stationFigures } from './figures';
import { wrap } from './lettering';
import { TYPE } from './paper-size';
import { bendName } from './part-words';
import type { SheetFlow } from './sheet-flow';
import { cellRoom, columnWidths, drawTable } from './table';
import type { Cell, Column } from './table';

/** Room for 120 63/64 with its miss. */
const STATION = 25;

const COLUMNS: readonly Column[] = [
  { head: ['line'], width: 10 },
  { head: ['name', 'in the chain'], width: 'rest' },
  { head: ['turn,', 'face up'], width: 18 },
  { head: ['angle'], width: 25 },
  { head: ['inside', 'radius'], width: 16, align: 'right' },
  { head: ['allowance', 'BA'], width: 18, align: 'right' },
  { head: ['setback', 'mold line'], width: 16, align: 'right' },
  { head: ['tangent', 'start'], width: STATION, align: 'right' },
  { head: ['bend line', '(centre)'], width: STATION, align: 'right' },
  { head: ['tangent', 'end'], width: STATION, align: 'right' },
  { head: ['sight line,', 'datum side under', 'the nose'], width: STATION, align: 'right' },
  { head: ['sight line,', 'far side under', 'the nose'], width: STATION, align: 'right' },
];

/** Everything that is marked and set for each bend line, with every station in each way that a shop reads one. */
export function drawLineSchedule(flow: SheetFlow, result: Solved): void {
  const room = cellRoom(columnWidths(COLUMNS, flow.area.width)[1] ?? 0);
  const rows = result.bends.map((bend, index) => rowOf(bend, index, result, room));
  const { unit } = result;
  const other = UNIT_WORDS[otherUnit(unit)];
  const beside = unit === 'in' ? `the nearest 1/64 with its miss (mark − station), and ${other}` : other;
  const ways = `${UNIT_WORDS[unit]}; under each ${beside}`;
  drawTable(flow, `Line schedule: stations from the net datum edge, ${ways}`, COLUMNS, rows);
}

function rowOf(bend: BendResult, index: number, result: Solved, room: number): Cell[] {
  const name = bendName(bend, result);
  const { sightLine } = bend;
  const { unit } = result;
  return [
    { lines: [lineName(index)], weight: 'semibold' },
    { lines: wrap(name, room, TYPE.body, 3), even: true },
    { lines: [bend.turn, faceUp(bend)] },
    { lines: [formatAngle(bend.angle), between(bend.angle), 'legs'] },
    { lines: [exactFigure(bend.radius, unit), `nose ${exactFigure(bend.noseRadius, unit)}`] },
    { lines: [lengthFigure(bend.allowance, unit), `K ${formatLength(bend.kFactor, 'in')}`, METHOD_WORDS[bend.method]] },
    { lines: [bend.setback === null ? 'none' : lengthFigure(bend.setback, unit)] },
    stationCell(bend.tangentStart, unit),
    { ...stationCell(bend.centre, unit), weight: 'semibold' },
    stationCell(bend.tangentEnd, unit),
    stationCell(sightLine?.startUnderNose ?? null, unit),
    stationCell(sightLine?.endUnderNose ?? null, unit),
  ];
}

export const stationCell = (value: number | null, unit: Unit): Cell => ({ lines: stationFigures(value, unit) });
