import { isReturnBend } from '../geometry/tolerance';
import type { Measure } from '../part/document';

const HALF_RADIAN = Math.PI / 360;

/**
 * Setback: from the point that a leg is dimensioned to, back to its bend tangent line.
 *
 * mold-line `(R+T)·tan(A/2)` · inside `R·tan(A/2)` · outside-edge (by calipers) `(R+T)·tan(A/2)` for A ≤ 90°, `R+T` above · flat `0`
 *
 * @param measure how this end of the leg is dimensioned
 * @param angle A, degrees bent from flat, 0 < A ≤ 180 @param radius R ≥ 0 @param thickness T > 0
 * @returns the setback in the same unit, or null for mold-line and inside at 180°, where there is no mold point
 * @source FAA-H-8083-31 ch. 4 and AC 43.13-1B ch. 4 (setback, K chart of tan(A/2)) for mold-line; by calipers: geometry
 * @example setback('mold-line', 90, 0.125, 0.04) // 0.165
 */
export function setback(measure: Measure, angle: number, radius: number, thickness: number): number | null {
  switch (measure) {
    case 'flat':
      return 0;
    case 'outside-edge':
      return angle > 90 ? radius + thickness : (radius + thickness) * halfTangent(angle);
    case 'inside':
      return isReturnBend(angle) ? null : radius * halfTangent(angle);
    case 'mold-line':
      return isReturnBend(angle) ? null : (radius + thickness) * halfTangent(angle);
  }
}

/**
 * tan(A/2), the handbook's K chart; exactly 1 at 90°.
 *
 * @param angle A in degrees, 0 ≤ A < 180 @source AC 43.13-1B table 4-7 prints it for every degree
 * @example halfTangent(60) // 0.57735…
 */
export function halfTangent(angle: number): number {
  return angle === 90 ? 1 : Math.tan(angle * HALF_RADIAN);
}
