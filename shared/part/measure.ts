import type { Leg, Measure } from './document';

/** In the order in which people are offered them; the first is assumed when a leg says nothing. */
export const MEASURES: readonly Measure[] = ['mold-line', 'outside-edge', 'inside', 'flat'];

/**
 * How both ends of a leg are dimensioned, whichever way the document says it.
 *
 * @example measureEnds({}) // ['mold-line', 'mold-line']
 */
export function measureEnds({ measure = 'mold-line' }: Pick<Leg, 'measure'>): readonly [Measure, Measure] {
  return typeof measure === 'string' ? [measure, measure] : measure;
}
