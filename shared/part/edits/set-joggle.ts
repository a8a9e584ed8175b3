import type { Expression, PartDocument } from '../document';
import { isJoggle } from '../document';
import { replaceEntry } from './entry';

/** Depth or run of one joggle. */
export function setJoggle(
  document: PartDocument,
  index: number,
  field: 'joggle' | 'run',
  value: Expression,
): PartDocument {
  return replaceEntry(document, index, (entry) =>
    !isJoggle(entry) || entry[field] === value ? entry : { ...entry, [field]: value },
  );
}
