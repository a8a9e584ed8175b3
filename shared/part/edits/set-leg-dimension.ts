import type { Expression, PartDocument } from '../document';
import { isLeg } from '../document';
import { replaceEntry } from './entry';

/** The length of one leg, as typed; whether it can be read is the engine's to say. */
export function setLegDimension(document: PartDocument, index: number, dimension: Expression): PartDocument {
  return replaceEntry(document, index, (entry) =>
    !isLeg(entry) || entry.leg === dimension ? entry : { ...entry, leg: dimension },
  );
}
