const DEGREE = Math.PI / 180;

/** A unit vector. */
export interface Direction {
  readonly x: number;
  readonly y: number;
}

const QUARTERS: readonly Direction[] = [
  { x: 1, y: 0 },
  { x: 0, y: 1 },
  { x: -1, y: 0 },
  { x: 0, y: -1 },
];

/**
 * The direction at an angle, exact at the quarter turns so that square sections stay square.
 *
 * @param degrees counter-clockwise from +x, any finite angle
 * @example direction(90) // { x: 0, y: 1 }
 */
export function direction(degrees: number): Direction {
  const turn = ((degrees % 360) + 360) % 360;
  if (turn % 90 === 0) return QUARTERS[turn / 90]!;
  return { x: Math.cos(turn * DEGREE), y: Math.sin(turn * DEGREE) };
}
