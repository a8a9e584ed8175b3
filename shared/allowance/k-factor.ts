const RADIAN = Math.PI / 180;

/**
 * Bend allowance from a K-factor: the arc length of the neutral line.
 *
 * `BA = a · (R + K·T)`, a = A in radians.
 *
 * @param angle A, degrees bent from flat, 0 < A ≤ 180
 * @param radius R, finished inside radius, R ≥ 0, in the part's unit
 * @param thickness T > 0, in the part's unit
 * @param k K, neutral line at K·T from the inside face, 0 < K ≤ 1
 * @returns BA in the part's unit; never fails inside the range
 * @source definition of the K-factor
 * @example kFactorAllowance(90, 0.25, 0.051, 0.5) // 0.43275…
 */
export function kFactorAllowance(angle: number, radius: number, thickness: number, k: number): number {
  return angle * RADIAN * (radius + k * thickness);
}

/**
 * The K-factor that an allowance implies: `K = (BA/a − R)/T`.
 *
 * @param allowance BA @param angle A in degrees, 0 < A ≤ 180 @param radius R @param thickness T > 0
 * @returns K; outside 0…1 the allowance is no neutral line of this sheet
 * @source definition of the K-factor, solved for K
 * @example impliedK(0.2241675, 90, 0.125, 0.04) // 0.44273…
 */
export function impliedK(allowance: number, angle: number, radius: number, thickness: number): number {
  return (allowance / (angle * RADIAN) - radius) / thickness;
}
