/** Every comparison of figures that may differ by rounding stands here, so that the whole engine agrees on "equal". */

/** Relative: parts whose pieces come nearer than this times their size are taken to touch. */
export const TOUCHING = 1e-9;

/** Degrees: an angle this near 180° is a return bend, which has no mold point. */
const RETURN_BEND = 1e-9;

/** Relative slack for a limit that a figure may meet exactly. */
const LIMIT = 1e-12;

/** Degrees: directions this near are parallel. */
const PARALLEL = 1e-9;

/** @example isReturnBend(180) // true */
export function isReturnBend(angle: number): boolean {
  return angle >= 180 - RETURN_BEND;
}

/** Above a limit by more than rounding. @example exceeds(0.5, 0.5) // false */
export function exceeds(value: number, limit: number): boolean {
  return value > limit + LIMIT * Math.max(1, Math.abs(limit));
}

/** Below a limit by more than rounding. @example fallsShort(3 * 0.04, 0.12) // false */
export function fallsShort(value: number, limit: number): boolean {
  return value < limit - LIMIT * Math.max(1, Math.abs(limit));
}

/** What figures of this size leave when they cancel. @example isRounding(0.9 - 0.6 - 0.3, 0.9) // true */
export function isRounding(rest: number, size: number): boolean {
  return Math.abs(rest) <= LIMIT * Math.abs(size);
}

/** Two directions in degrees, either way round. @example areParallel(90, 270) // true */
export function areParallel(a: number, b: number): boolean {
  const turn = (((a - b) % 180) + 180) % 180;
  return turn < PARALLEL || turn > 180 - PARALLEL;
}
