const DEGREE = Math.PI / 180;

/** Relative: the last bits of a sum of three squares. */
const ROUNDING = 4 * Number.EPSILON;

export type JoggleShape =
  | { readonly ok: true; readonly angle: number; readonly straight: number }
  | { readonly ok: false; readonly shortestRun: number };

/**
 * The two equal and opposite bends of a joggle, and the straight between them, in closed form.
 *
 * With ρ = 2R + T and h = √(L² + (ρ−D)²): `θ = atan2(L, ρ−D) − acos(ρ/h)`, `s = √(L² + D² − 2ρD)`.
 *
 * @param depth D > 0, face to same face @param run L > 0, along the leg between the outer tangent lines
 * @param radius R ≥ 0 @param thickness T > 0
 * @returns angle of each bend in degrees and the straight, or the shortest run that these radii allow:
 *   `√(2ρD − D²)` for D ≤ ρ, else ρ
 * @source geometry: two arcs of radius R + T/2 at mid-thickness joined by their common tangent
 * @example joggle(0.04, 0.25, 0.125, 0.04) // { ok: true, angle: 10.109…, straight: 0.2022… }
 */
export function joggle(depth: number, run: number, radius: number, thickness: number): JoggleShape {
  const rho = 2 * radius + thickness;
  const shortestRun = depth <= rho ? Math.sqrt(2 * rho * depth - depth * depth) : rho;
  const squared = run * run + depth * depth - 2 * rho * depth;
  // At the shortest run itself the two sides are equal, and rounding alone decides the sign of what is left.
  const slack = ROUNDING * (run * run + depth * depth + 2 * rho * depth);
  if (squared < -slack) return { ok: false, shortestRun };
  const straight = squared <= slack ? 0 : Math.sqrt(squared);
  // acos(ρ/h) as atan2(s, ρ), which keeps its digits where ρ/h is near 1.
  const angle = Math.atan2(run, rho - depth) - Math.atan2(straight, rho);
  if (angle > Math.PI / 2 + 1e-12) return { ok: false, shortestRun };
  return { ok: true, angle: angle / DEGREE, straight };
}
