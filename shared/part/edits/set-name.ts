import type { PartDocument } from '../document';
import { replaceEntry } from './entry';

/** The name of a leg, bend or joggle; an empty one takes the name away. */
export function setName(document: PartDocument, index: number, name: string): PartDocument {
  return replaceEntry(document, index, (entry) => {
    if ((entry.name ?? '') === name) return entry;
    if (name !== '') return { ...entry, name };
    const { name: _gone, ...rest } = entry;
    return rest;
  });
}
