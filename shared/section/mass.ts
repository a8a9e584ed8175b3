import type { Unit } from '../part/document';

export type MassUnit = 'lb' | 'kg';

const METRE: Readonly<Record<Unit, number>> = { in: 0.0254, mm: 0.001 };
/** Kilograms in one avoirdupois pound, exact by definition. */
const KG_PER_LB = 0.45359237;
/** Figures of a mass that mean something: a density is hardly known better. */
const SIGNIFICANT = 3;

/** What a mass is given in beside lengths of a unit. */
export const MASS_UNIT: Readonly<Record<Unit, MassUnit>> = { in: 'lb', mm: 'kg' };

/**
 * Mass of the blank: area × T × density.
 *
 * @param area net area of the blank, unit² @param thickness T, unit @param density kg/m³ @param unit of the part
 * @returns pounds for an inch part, kilograms for a millimetre part
 * @example massOf(100, 0.04, 2768, 'in') // { value: 0.4, unit: 'lb' } to four places
 */
export function massOf(
  area: number,
  thickness: number,
  density: number,
  unit: Unit,
): { value: number; unit: MassUnit } {
  const kilograms = area * thickness * METRE[unit] ** 3 * density;
  return { value: convertMass(kilograms, 'kg', MASS_UNIT[unit]), unit: MASS_UNIT[unit] };
}

/** @example convertMass(1, 'lb', 'kg') // 0.45359237 */
export function convertMass(value: number, from: MassUnit, to: MassUnit): number {
  if (from === to) return value;
  return to === 'kg' ? value * KG_PER_LB : value / KG_PER_LB;
}

/**
 * A mass for a person to read, in three significant figures without an exponent; the unit is not appended.
 *
 * @param value at least 0
 * @example formatMass(0.0012144) // '0.00121'
 */
export function formatMass(value: number): string {
  if (value === 0) return '0';
  const rounded = Number(value.toPrecision(SIGNIFICANT));
  const places = SIGNIFICANT - 1 - Math.floor(Math.log10(rounded));
  return rounded.toFixed(Math.min(Math.max(places, 0), 100));
}
