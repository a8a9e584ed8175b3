/** Papers of a revision: for now the dimensioned blank as a PDF. */
import * as z from 'zod';

export const PAPER_SIZES = ['a4', 'letter'] as const;

export const blankPaperSchema = z.strictObject({
  size: z.enum(PAPER_SIZES).default('a4'),
});
export type PaperSize = (typeof PAPER_SIZES)[number];
