/** Coefficients as the handbook prints them. 0.01743 is a little below π/180, so the implied K falls a little with R/T. */
export const HANDBOOK_RADIUS = 0.01743;
export const HANDBOOK_THICKNESS = 0.0078;

/**
 * Bend allowance by the airframe handbook's empirical formula.
 *
 * `BA = (0.01743·R + 0.0078·T) · A`
 *
 * @param angle A, degrees bent from flat, 0 < A ≤ 180
 * @param radius R ≥ 0 @param thickness T > 0, same unit
 * @returns BA in that unit
 * @source FAA-H-8083-31, Aviation Maintenance Technician Handbook – Airframe, ch. 4, Layout and Forming, "Bend allowance"
 * @example handbookAllowance(90, 0.16, 0.04) // 0.279072
 */
export function handbookAllowance(angle: number, radius: number, thickness: number): number {
  return (HANDBOOK_RADIUS * radius + HANDBOOK_THICKNESS * thickness) * angle;
}
