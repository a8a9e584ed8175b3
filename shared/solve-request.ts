import type { SolveResult } from './result';
import { solve } from './solve';

/**
 * The answer to one request at any door: a bare part document, or `{ "document": …, "shop": … }`.
 *
 * @param value parsed JSON of any origin @returns as `solve`; never throws on bad input
 * @example solveRequest({ document: null }).ok // false
 */
export function solveRequest(value: unknown): SolveResult {
  if (typeof value !== 'object' || value === null || Array.isArray(value) || !Object.hasOwn(value, 'document')) {
    return solve(value);
  }
  const { document, shop, ...rest } = value as { document: unknown; shop?: unknown };
  const [stray] = Object.keys(rest);
  if (stray !== undefined) {
    return { ok: false, errors: [{ path: stray, message: 'Only "document" and "shop" may stand here.' }] };
  }
  return solve(document, shop);
}
