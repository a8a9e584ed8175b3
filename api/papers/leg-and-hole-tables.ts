import type { PartDocument } from '../../shared/part/document';
import { legName, measureWords } from '../../shared/part/words';
import type { Solved } from '../../shared/result';
import { lengthFigure } from './figures';
import { shorten, wrap } from './lettering';
import { stationCell } from './line-schedule';
import { TYPE } from './paper-size';
import type { SheetFlow } from './sheet-flow';
import { cellRoom, columnWidths, drawTable } from './table';
import type { Column } from './table';

const LEGS: readonly Column[] = [
  { head: ['leg'], width: 12 },
  { head: ['name'], width: 'rest' },
  { head: ['dimension'], width: 24, align: 'right' },
  { head: ['measured'], width: 42 },
  { head: ['setback start'], width: 24, align: 'right' },
  { head: ['setback end'], width: 24, align: 'right' },
  { head: ['flat'], width: 24, align: 'right' },
  { head: ['flat from'], width: 26, align: 'right' },
  { head: ['flat to'], width: 26, align: 'right' },
];

export function drawLegs(flow: SheetFlow, { legs, unit }: Solved): void {
  const room = cellRoom(columnWidths(LEGS, flow.area.width)[1] ?? 0);
  const rows = legs.map((leg, index) => [
    { lines: [String(index + 1)], weight: 'semibold' as const },
    { lines: wrap(legName(leg.name, index), room, TYPE.body, 2), even: true },
    { lines: [lengthFigure(leg.dimension, unit)] },
    { lines: [measureWords(leg.measure)] },
    { lines: [lengthFigure(leg.setback[0], unit)] },
    { lines: [lengthFigure(leg.setback[1], unit)] },
    { lines: [lengthFigure(leg.flat > 0 ? leg.flat : null, unit)], weight: 'semibold' as const },
    { lines: [lengthFigure(leg.start, unit)] },
    { lines: [lengthFigure(leg.end, unit)] },
  ]);
  drawTable(flow, 'Legs', LEGS, rows);
}

const HOLES: readonly Column[] = [
  { head: ['hole'], width: 14 },
  { head: ['name'], width: 'rest' },
  { head: ['in leg'], width: 60 },
  { head: ['diameter'], width: 26, align: 'right' },
  { head: ['station of centre'], width: 36, align: 'right' },
  { head: ['across, from the datum corner'], width: 48, align: 'right' },
];

export function drawHoles(flow: SheetFlow, { holes, legs, unit }: Solved, document: PartDocument): void {
  if (holes.length === 0) return;
  const widths = columnWidths(HOLES, flow.area.width);
  const rows = holes.map(({ hole, leg, station, across, diameter }, index) => [
    { lines: [holeNumber(holes, index)], weight: 'semibold' as const },
    { lines: [shorten(document.holes?.[hole]?.name ?? '', cellRoom(widths[1] ?? 0), TYPE.body)] },
    { lines: [shorten(legName(legs[leg]?.name ?? null, leg), cellRoom(widths[2] ?? 0), TYPE.body)] },
    { lines: [lengthFigure(diameter, unit)] },
    stationCell(station, unit),
    stationCell(across, unit),
  ]);
  drawTable(flow, 'Holes', HOLES, rows);
}

/** A hole by its number in the document, as the findings name it; the holes of a row are counted behind a point. */
export function holeNumber(holes: Solved['holes'], index: number): string {
  const hole = holes[index]?.hole ?? 0;
  const row = holes.filter((other) => other.hole === hole);
  const place = holes.slice(0, index + 1).filter((other) => other.hole === hole).length;
  return row.length > 1 ? `${hole + 1}.${place}` : String(hole + 1);
}
