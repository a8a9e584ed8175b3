import type { Expression, PartDocument } from '../document';
import { isLeg } from '../document';
import { replaceEntry } from './entry';

/** Finished inside radius of a bend, or of both bends of a joggle. */
export function setRadius(document: PartDocument, index: number, radius: Expression): PartDocument {
  return replaceEntry(document, index, (entry) =>
    isLeg(entry) || entry.radius === radius ? entry : { ...entry, radius },
  );
}
