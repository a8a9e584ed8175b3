/**
 * Materials that a part may name. Typical room-temperature figures, not design allowables: good for a mass and for a first
 * springback figure, never for strength.
 */
import type { Material } from '../part/document';

export interface ReferenceMaterial extends Material {
  readonly density: number;
  readonly modulus: number;
  readonly yield: number;
  readonly source: string;
}

/** MPa in one ksi, and kg/m³ in one lb/in³, from the exact inch and pound and standard gravity. */
const KSI = 6.894757293168361;
const LB_PER_IN3 = 0.45359237 / 0.0254 ** 3;

const TYPICAL = 'Aluminum Association, typical properties';

export const MATERIALS: readonly ReferenceMaterial[] = [
  aluminium('2024-O', 0.1, 10600, 11, `${TYPICAL} (from memory)`),
  aluminium('2024-T3', 0.1, 10600, 50, `${TYPICAL} (from memory)`),
  aluminium('Alclad 2024-T3', 0.1, 10600, 45, `${TYPICAL}; density from memory`),
  aluminium('6061-O', 0.0975, 10000, 8, `${TYPICAL}; density of the alloy 2.70 g/cm³`),
  aluminium('6061-T6', 0.0975, 10000, 40, `${TYPICAL}; density 2.70 g/cm³`),
  aluminium('7075-O', 0.102, 10400, 15, `${TYPICAL} (from memory)`),
  aluminium('7075-T6', 0.102, 10400, 73, TYPICAL),
  aluminium('5052-H32', 0.097, 10200, 28, `${TYPICAL} (from memory)`),
  {
    name: '304',
    density: 0.289 * LB_PER_IN3,
    modulus: 193000,
    yield: 215,
    source: 'AISI 304 data sheet, annealed, typical',
  },
  {
    name: '4130N',
    density: 0.283 * LB_PER_IN3,
    modulus: 29000 * KSI,
    yield: 60 * KSI,
    source: 'General reference table of representative values, 4130 normalized',
  },
];

const BY_NAME: ReadonlyMap<string, ReferenceMaterial> = new Map(MATERIALS.map((material) => [material.name, material]));

/**
 * @param name as a document gives it, to the letter
 * @returns the reference figures, or null when the table does not hold it
 * @example findMaterial('7075-T6')?.name // '7075-T6'
 */
export function findMaterial(name: string): ReferenceMaterial | null {
  return BY_NAME.get(name) ?? null;
}

/** lb/in³ and ksi, as the tables print them, into kg/m³ and MPa. */
function aluminium(
  name: string,
  density: number,
  modulus: number,
  yielding: number,
  source: string,
): ReferenceMaterial {
  return { name, density: density * LB_PER_IN3, modulus: modulus * KSI, yield: yielding * KSI, source };
}
