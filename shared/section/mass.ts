import type { Unit } from '../part/document';

const METRE: Readonly<Record<Unit, number>> = { in: 0.0254, mm: 0.001 };
/** Kilograms in one avoirdupois pound, exact by definition. */
const KG_PER_LB = 0.45359237;

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
): { value: number; unit: 'lb' | 'kg' } {
  const kilograms = area * thickness * METRE[unit] ** 3 * density;
  return unit === 'in' ? { value: kilograms / KG_PER_LB, unit: 'lb' } : { value: kilograms, unit: 'kg' };
}
