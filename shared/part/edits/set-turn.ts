import type { PartDocument, Turn } from '../document';
import { isLeg } from '../document';
import { replaceEntry } from './entry';

/** Up or down, for a bend or a joggle. */
export function setTurn(document: PartDocument, index: number, turn: Turn): PartDocument {
  return replaceEntry(document, index, (entry) => (isLeg(entry) || entry.turn === turn ? entry : { ...entry, turn }));
}
