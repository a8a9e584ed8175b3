import { computed, inject, Injectable, signal } from '@angular/core';
import type { Part } from '@shared/contracts/parts';
import { sameDocument } from '@shared/part/same-document';
import { LocalCopies, type LocalCopy, type Stay } from './local-copies';
import { OpenVisits } from './open-visits';

interface Found {
  readonly stay: Stay;
  readonly copy: LocalCopy;
}

/** Copies that earlier visits to the open draft have left in this browser. A copy stays until somebody settles it. */
@Injectable()
export class LeftBehind {
  private readonly copies = inject(LocalCopies);
  private readonly visits = inject(OpenVisits);
  private readonly found = signal<readonly Found[]>([]);
  private looks = 0;

  readonly copy = computed(() => this.found()[0]?.copy ?? null);

  async look({ id, revision }: Part, person: string): Promise<void> {
    const look = ++this.looks;
    this.found.set([]);
    const { letter } = revision;
    const all = this.copies.all(person, id, letter);
    if (all.length === 0) return;
    // What another tab has open is its own work, whether it is saved yet or not.
    const ended = new Set(await this.visits.ended(all.map(({ visit }) => visit)));
    if (look !== this.looks) return;
    const left: Found[] = [];
    for (const { visit, copy } of all.filter((one) => ended.has(one.visit))) {
      const stay = { person, part: id, letter, visit };
      const document = sameDocument(copy.document, revision.document) ? null : copy.document;
      if (document === null && copy.typed === null) this.copies.drop(stay);
      else left.push({ stay, copy: { ...copy, document } });
    }
    this.found.set(left);
  }

  /** The copy that is offered is done with; the next one, if there is one, takes its place. */
  settle(): void {
    const [first, ...rest] = this.found();
    if (first) this.copies.drop(first.stay);
    this.found.set(rest);
  }
}
