import type { Material } from '../part/document';
import type { Springback } from '../result';

/** Steps of bisection that bring a bracket of 1 below the last bit of a double. */
const MOST_STEPS = 64;

/**
 * The tool radius that springs back to a finished radius, and the angle to swing to.
 *
 * Gardiner: with x = Ri·Y/(E·T), `Ri/Rf = 4x³ − 3x + 1` (Ri tool radius, Rf finished radius, 0 < x < 1/2).
 * The length at mid-thickness is kept: `A_tool = A·(Rf + T/2)/(Ri + T/2)`.
 *
 * @param angle A, finished, degrees, 0 < A ≤ 180 @param radius Rf, finished inside radius, ≥ 0
 * @param thickness T > 0 @param material with modulus E and yield stress Y in one unit, or null
 * @returns tool radius in the part's unit and tool angle in degrees; null when E or Y is not known
 * @source F. J. Gardiner, "The springback of metals", Trans. ASME 79 (1957)
 * @example gardiner(90, 0.125, 0.04, { name: 'x', modulus: 73000, yield: 345 })?.toolAngle // 93.41…
 */
export function gardiner(
  angle: number,
  radius: number,
  thickness: number,
  material: Material | null,
): Springback | null {
  if (material?.modulus === undefined || material.yield === undefined) return null;
  const slope = material.yield / (material.modulus * thickness);
  const toolRadius = radius === 0 ? 0 : solveTool(radius, slope);
  const toolAngle = (angle * (radius + thickness / 2)) / (toolRadius + thickness / 2);
  return { method: 'gardiner', toolRadius, toolAngle };
}

/**
 * Root of x/(slope·Rf) = 4x³ − 3x + 1 in (0, 1/2): the left side rises from 0, the right falls from 1 to 0,
 * so there is exactly one. Newton from the left of it, guarded by bisection.
 */
function solveTool(radius: number, slope: number): number {
  const gain = 1 / (slope * radius);
  let low = 0;
  let high = 0.5;
  let x = Math.min(0.25, 1 / (gain + 3));
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const miss = 4 * x * x * x - (3 + gain) * x + 1;
    if (miss > 0) low = x;
    else high = x;
    const next = x - miss / (12 * x * x - (3 + gain));
    const guarded = next > low && next < high ? next : (low + high) / 2;
    if (guarded === x || high - low <= Number.EPSILON * high) break;
    x = guarded;
  }
  return x / slope;
}
