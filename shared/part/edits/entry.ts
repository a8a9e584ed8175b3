/** How an edit reaches one entry of the chain. Everything it does not touch stays the same object. */
import type { ChainEntry, PartDocument } from '../document';

/** The document with one entry replaced; an index outside the chain, or a change that changes nothing, gives the same document back. */
export function replaceEntry(
  document: PartDocument,
  index: number,
  change: (entry: ChainEntry) => ChainEntry,
): PartDocument {
  const entry = document.chain[index];
  if (!entry) return document;
  const changed = change(entry);
  return changed === entry ? document : { ...document, chain: document.chain.with(index, changed) };
}

/**
 * An id for a new entry, or none when the chain goes without them. Deterministic, so that an edit stays a pure function:
 * the lowest number that no entry and no hole uses.
 */
export function freshIds(document: PartDocument, count: number): (string | undefined)[] {
  const used = new Set([...document.chain, ...(document.holes ?? [])].map((one) => one.id));
  const carriesIds = document.chain.some((entry) => entry.id !== undefined);
  const ids: (string | undefined)[] = [];
  for (let number = 1; ids.length < count; number++) {
    const id = `e${number}`;
    if (!carriesIds) ids.push(undefined);
    else if (!used.has(id)) ids.push(id);
  }
  return ids;
}

/** Legs are counted without bends and joggles: the leg number of the entry at `index`, or of the next leg after it. */
export function legNumberAt(document: PartDocument, index: number): number {
  return document.chain.slice(0, index).filter((entry) => 'leg' in entry).length;
}

/** Holes and the seat name a leg by its number; this keeps them on their leg when the numbers move. */
export function renumberLegs(document: PartDocument, number: (leg: number) => number): PartDocument {
  const seat = document.seat === undefined ? {} : { seat: number(document.seat) };
  const holes = document.holes ? { holes: document.holes.map((hole) => ({ ...hole, leg: number(hole.leg) })) } : {};
  return { ...document, ...seat, ...holes };
}
