/** Up to this R/T the correction factor grows; past it the neutral line is taken at mid-thickness. */
const FULL_RATIO = 5;

/**
 * Correction factor k of DIN 6935 (not the K-factor: K = k/2).
 *
 * `k = 0.65 + 0.5·log10(R/T)` for R/T ≤ 5, `k = 1` beyond.
 *
 * @param radius R > 0 @param thickness T > 0, same unit
 * @returns k; ≤ 0 where R/T is so small that the rule has no answer (R/T ≤ 10^−1.3, about 0.05)
 * @source DIN 6935. Its neglect of bends below 15° is not applied: the rule runs at every angle.
 * @example din6935Factor(3, 2) // 0.73804…
 */
export function din6935Factor(radius: number, thickness: number): number {
  const ratio = radius / thickness;
  return ratio > FULL_RATIO ? 1 : 0.65 + 0.5 * Math.log10(ratio);
}
