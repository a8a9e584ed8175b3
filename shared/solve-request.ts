import type { SolveResult } from './result';
import { ShopContext, solve } from './solve';

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
  if (stray !== undefined) return refused(stray, 'Only "document" and "shop" may stand here.');
  if (shop !== undefined && (typeof shop !== 'object' || shop === null || Array.isArray(shop))) {
    return refused('shop', 'Expected the shop context: a JSON object.');
  }
  return solve(document, (shop ?? {}) as ShopContext);
}

const refused = (path: string, message: string): SolveResult => ({ ok: false, errors: [{ path, message }] });
