import type { Unit } from '../../shared/part/document';
import { PLACES, formatLength, missText, nearest64 } from '../../shared/units/format';
import { convertLength } from '../../shared/units/length';

/** What stands where a figure would rest on a broken one: never a dash that could be read as nothing to do. */
export const NO_FIGURE = 'no figure';

const minus = (figure: string): string => figure.replace(/^-/u, '−');

export const lengthFigure = (value: number | null, unit: Unit): string =>
  value === null ? NO_FIGURE : minus(formatLength(value, unit));

/** Thickness and radii are often given to four places in inches; they are not rounded away. */
export function exactFigure(value: number, unit: Unit): string {
  const usual = formatLength(value, unit);
  const finer = formatLength(value, unit, PLACES[unit] + 1);
  return finer === `${usual}0` ? usual : finer;
}

export const otherUnit = (unit: Unit): Unit => (unit === 'in' ? 'mm' : 'in');

/** "148.21 mm" beside an inch figure, "5.835 in" beside a millimetre one. */
export function otherFigure(value: number, unit: Unit): string {
  const other = otherUnit(unit);
  return `${lengthFigure(convertLength(value, unit, other), other)} ${other}`;
}

/** "5 53/64 −0.007": the mark on a rule, and how far that mark is from the figure. */
export function sixtyfourthFigure(inches: number): string {
  const { text, error } = nearest64(inches);
  return `${text} ${missText(error)}`;
}

/** A station in every way a shop reads it, one a line. */
export function stationFigures(value: number | null, unit: Unit): string[] {
  if (value === null) return [NO_FIGURE];
  const first = lengthFigure(value, unit);
  return unit === 'in'
    ? [first, sixtyfourthFigure(value), otherFigure(value, unit)]
    : [first, otherFigure(value, unit)];
}

/** "2026-12-01 13:31:21 UTC": to the second, in universal time. */
export const instant = (date: Date): string => `${date.toISOString().slice(0, 19).replace('T', ' ')} UTC`;
