import { layOutBlankPaper } from './blank-layout';
import type { BlankPaperInput } from './blank-paper-input';
import { drawPaper } from './draw-paper';

/**
 * The dimensioned blank of a revision as a PDF.
 *
 * @param input part, revision, its document and the figures kept with it, shop, paper size, and who has it issued when
 * @returns the bytes of the PDF; the same input gives the same bytes
 */
export function blankPaper(input: BlankPaperInput): Promise<Uint8Array> {
  return drawPaper(layOutBlankPaper(input));
}
