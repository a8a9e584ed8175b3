import { type ChainEntry, isBend, isJoggle, isLeg } from './document';

/**
 * Gives the entries of a new chain what the old one knew of them beyond their figures: ids, names, allowances, noses.
 *
 * Entries that stay are found from both ends: those alike from the front, those alike from the back, and when the chain has
 * kept its length, those of one kind in one place.
 *
 * @param previous the chain as it was @param next the chain as it is to be, with figures only
 */
export function keepFrom(previous: readonly ChainEntry[], next: readonly ChainEntry[]): ChainEntry[] {
  if (previous.length === next.length) return next.map((entry, i) => carried(previous[i]!, entry));
  const shorter = Math.min(previous.length, next.length);
  let front = 0;
  while (front < shorter && alike(previous[front]!, next[front]!)) front += 1;
  let back = 0;
  while (back < shorter - front && alike(previous.at(-1 - back)!, next.at(-1 - back)!)) back += 1;
  return next.map((entry, i) => {
    if (i < front) return carried(previous[i]!, entry);
    return i >= next.length - back ? carried(previous[i - next.length + previous.length]!, entry) : entry;
  });
}

/** Same kind and same figures. */
function alike(a: ChainEntry, b: ChainEntry): boolean {
  if (isLeg(a) && isLeg(b)) return same(a.leg, b.leg);
  if (isBend(a) && isBend(b)) return same(a.bend, b.bend) && a.turn === b.turn && same(a.radius, b.radius);
  return isJoggle(a) && isJoggle(b) && same(a.joggle, b.joggle) && same(a.run, b.run) && a.turn === b.turn;
}

const same = (a: string | number, b: string | number): boolean => String(a) === String(b);

function carried(old: ChainEntry, entry: ChainEntry): ChainEntry {
  const kept: Record<string, unknown> = {};
  const fields =
    isLeg(old) && isLeg(entry) ? ['id', 'name'] : isLeg(old) || isLeg(entry) ? [] : ['id', 'name', 'allowance', 'nose'];
  // A joggle turned into a bend is another thing: its id must not carry over what hangs on it.
  if (isBend(old) !== isBend(entry)) return entry;
  for (const field of fields) {
    const value = (old as unknown as Record<string, unknown>)[field];
    if (value !== undefined) kept[field] = value;
  }
  return { ...entry, ...kept };
}
