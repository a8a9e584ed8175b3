import type { Measure, PartDocument } from '../document';
import { isLeg } from '../document';
import { measureEnds } from '../measure';
import { replaceEntry } from './entry';

/**
 * How the two ends of one leg are dimensioned. Ends that agree are kept as one word, and the word that is assumed anyway
 * is not written down, so that equal parts have equal documents.
 */
export function setMeasure(
  document: PartDocument,
  index: number,
  measure: Measure | readonly [Measure, Measure],
): PartDocument {
  return replaceEntry(document, index, (entry) => {
    if (!isLeg(entry)) return entry;
    const [start, end] = measureEnds({ measure });
    const { measure: former, ...rest } = entry;
    if (start !== end) return { ...rest, measure: [start, end] };
    if (start === 'mold-line') return former === undefined ? entry : rest;
    return former === start ? entry : { ...rest, measure: start };
  });
}
