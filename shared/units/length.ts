import type { Unit } from '../part/document';

/** Millimetres in one inch, exact by definition (international inch, 1959). */
export const MM_PER_INCH = 25.4;

/** Units that an expression may put behind a figure, in millimetres. */
export const LENGTH_UNITS: ReadonlyMap<string, number> = new Map([
  ['mm', 1],
  ['cm', 10],
  ['m', 1000],
  ['in', MM_PER_INCH],
  ['inch', MM_PER_INCH],
  ['inches', MM_PER_INCH],
  ['ft', 12 * MM_PER_INCH],
]);

/** Units of angle, in degrees. */
export const ANGLE_UNITS: ReadonlyMap<string, number> = new Map([
  ['deg', 1],
  ['°', 1],
  ['rad', 180 / Math.PI],
]);

/**
 * A length in another unit.
 *
 * @param value length in `from` @param from its unit @param to the unit wanted
 * @returns the same length in `to`; any finite value
 * @example convertLength(1, 'in', 'mm') // 25.4
 */
export function convertLength(value: number, from: Unit, to: Unit): number {
  if (from === to) return value;
  return to === 'mm' ? value * MM_PER_INCH : value / MM_PER_INCH;
}
