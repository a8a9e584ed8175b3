import type { Expression, PartDocument } from '../document';
import { isBend } from '../document';
import { replaceEntry } from './entry';

/** Degrees that one bend is bent from flat, as typed. */
export function setBendAngle(document: PartDocument, index: number, angle: Expression): PartDocument {
  return replaceEntry(document, index, (entry) =>
    !isBend(entry) || entry.bend === angle ? entry : { ...entry, bend: angle },
  );
}
