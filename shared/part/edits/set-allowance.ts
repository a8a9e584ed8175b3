import type { Allowance, PartDocument } from '../document';

/** The rule by which the bend allowance of the part is taken; overrides of single bends stay. */
export function setAllowance(document: PartDocument, allowance: Allowance): PartDocument {
  return document.allowance === allowance ? document : { ...document, allowance };
}
