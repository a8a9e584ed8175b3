import type { ChainEntry, PartDocument } from '../document';
import { isLeg } from '../document';

const legs = (chain: readonly ChainEntry[]): number => chain.filter(isLeg).length;

/** Why another chain can't take the place of this one, or null when it can. */
export function whyChainStays(document: PartDocument, chain: readonly ChainEntry[]): string | null {
  // A hole names its leg by number: with another number of legs it would land on a leg that nobody meant.
  const holed = (document.holes?.length ?? 0) > 0 && legs(chain) !== legs(document.chain);
  return holed
    ? 'The part has holes: legs are added and taken out in the ledger, so that the holes stay on theirs.'
    : null;
}

/** The whole chain at once, as the typed chain gives it. A seat on a leg that is gone is given up. */
export function replaceChain(document: PartDocument, chain: readonly ChainEntry[]): PartDocument {
  if (whyChainStays(document, chain) !== null) return document;
  if (document.seat === undefined || document.seat < legs(chain)) return { ...document, chain };
  const { seat: _gone, ...rest } = document;
  return { ...rest, chain };
}
