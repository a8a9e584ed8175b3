import type { PaperSize } from '../../shared/contracts/papers';
import type { PartDocument } from '../../shared/part/document';
import type { Solved } from '../../shared/result';

/** Everything that the paper says. The same input gives the same paper, byte for byte. */
export interface BlankPaperInput {
  readonly part: { readonly number: string; readonly title: string };
  readonly revision: {
    readonly letter: string;
    readonly state: string;
    readonly version: number;
    /** ISO date-time. */
    readonly changedAt: string;
    readonly changedBy: string;
  };
  readonly document: PartDocument;
  readonly result: Solved;
  readonly shop: string;
  readonly size: PaperSize;
  readonly issuedAt: Date;
  readonly issuedBy: string;
}
