import type { Hardness } from '../part/document';

/** Multiples of T in the 90° length, by the hardness of the metal. */
export const RULE_90_THICKNESS: Readonly<Record<Hardness, number>> = { soft: 0.55, medium: 0.64, hard: 0.71 };

/** Multiple of R in the 90° length, as printed (π/2 to two places). */
export const RULE_90_RADIUS = 1.57;

/**
 * Bend allowance by the 90° rules: `(c·T + 1.57·R) · A/90`, c = 0.55 soft, 0.64 medium, 0.71 hard.
 *
 * @param angle A, degrees, 0 < A ≤ 180 @param radius R ≥ 0 @param thickness T > 0, same unit
 * @param hardness soft (copper, soft brass), medium (half-hard copper and brass, soft steel, aluminium), hard (bronze, hard copper, cold-rolled and spring steel)
 * @returns BA in that unit; other angles in proportion
 * @source Machinery's Handbook, "Allowances for bending sheet metal"
 * @example rule90Allowance(90, 0.125, 0.063, 'medium') // 0.23657
 */
export function rule90Allowance(angle: number, radius: number, thickness: number, hardness: Hardness): number {
  return ((RULE_90_THICKNESS[hardness] * thickness + RULE_90_RADIUS * radius) * angle) / 90;
}
