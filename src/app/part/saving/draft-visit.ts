import type { PartDocument } from '@shared/part/document';
import type { Part } from '@shared/contracts/parts';
import type { Revision } from '@shared/contracts/revisions';
import type { Stay } from './local-copies';

/** What one visit to one draft wants, and what it knows the server to have. */
export class DraftVisit {
  readonly stay: Stay;
  version!: number;
  wanted!: PartDocument;
  /** What the server has, so far as we know. */
  confirmed!: PartDocument;
  savedAt!: Date;
  /** Sent, but no answer came: the server may have it or not, until the very same save is answered. */
  unanswered: PartDocument | null = null;
  /** A typed chain that is not taken. */
  typed: string | null = null;
  /** Whether the engine takes what is wanted. */
  fit = true;
  underway = false;
  failures = 0;
  /** To be called when a visit that was left has nothing on its way any more. */
  finish: (() => void) | null = null;

  constructor(part: Part, person: string, visit: string) {
    this.stay = { person, part: part.id, letter: part.revision.letter, visit };
    this.follow(part.revision);
  }

  /** What the server has is what is wanted, and nothing on its way can change that. */
  get standing(): boolean {
    return this.wanted === this.confirmed && !this.underway && this.unanswered === null;
  }

  /** A save of unknown fate goes first: only the very same save is known again by the server. */
  get next(): PartDocument {
    return this.unanswered ?? this.wanted;
  }

  follow(revision: Revision): void {
    this.wanted = revision.document;
    this.stands(revision.document, revision);
  }

  /** The server has this now, whatever is wanted here. */
  stands(document: PartDocument, { version, changedAt }: Revision): void {
    this.version = version;
    this.confirmed = document;
    this.savedAt = new Date(changedAt);
    this.unanswered = null;
  }
}
