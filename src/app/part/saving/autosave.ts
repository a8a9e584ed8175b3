import { DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { Part } from '@shared/contracts/parts';
import type { Revision } from '@shared/contracts/revisions';
import type { PartDocument } from '@shared/part/document';
import { fromEvent, Subject, switchMap, timer } from 'rxjs';
import { Server } from '../../server/server';
import { ServerProblem } from '../../server/server-problem';
import { LocalCopies, type LocalCopy } from './local-copies';
import type { SaveState } from './save-state';

const QUIET = 800;
const FIRST_RETRY = 2_000;
const LAST_RETRY = 30_000;

interface Target {
  readonly person: string;
  readonly id: string;
  readonly letter: string;
}

/** Saves the document a moment after the last change: one request at a time, a local copy until the server confirms. */
@Injectable()
export class Autosave {
  private readonly server = inject(Server);
  private readonly copies = inject(LocalCopies);
  private readonly current = signal<SaveState>({ is: 'saved', at: null });
  private readonly found = signal<LocalCopy | null>(null);
  private readonly due = new Subject<number>();

  private target: Target | null = null;
  private version = 0;
  private wanted: PartDocument | null = null;
  private confirmed: PartDocument | null = null;
  private underway = false;
  private failures = 0;
  private kept = true;

  readonly state = this.current.asReadonly();
  /** A copy of work that an earlier visit could not save, when it differs from what the server has. */
  readonly leftBehind = this.found.asReadonly();

  constructor() {
    const window = inject(DOCUMENT).defaultView;
    // A later wish replaces an earlier one: typing puts the save off, a retry is overtaken by the next edit.
    this.due
      .pipe(
        switchMap((delay) => timer(delay)),
        takeUntilDestroyed(),
      )
      .subscribe(() => this.send());
    if (window) {
      fromEvent(window, 'online')
        .pipe(takeUntilDestroyed())
        .subscribe(() => this.retry());
    }
    inject(DestroyRef).onDestroy(() => this.send());
  }

  /** True while a closed window would lose work: not saved, and no local copy either. */
  get atRisk(): boolean {
    return this.current().is !== 'saved' && !this.kept;
  }

  open(part: Part, person: string): void {
    // What the part before still wanted is sent on its own account.
    this.send();
    this.underway = false;
    this.failures = 0;
    this.target = { person, id: part.id, letter: part.revision.letter };
    this.follow(part.revision);
    this.current.set({ is: 'saved', at: new Date(part.revision.changedAt) });
    this.lookForCopy(part, person);
  }

  /** The work of an earlier visit has been taken up again or given up. */
  settleCopy(): void {
    this.found.set(null);
    if (this.target) this.copies.dropAside(this.target.person, this.target.id, this.target.letter);
  }

  /** @param refused number of fields that the engine refuses */
  changed(document: PartDocument, refused: number): void {
    if (!this.target) return;
    this.wanted = document;
    const standing = document === this.confirmed && !this.underway;
    if (standing) this.dropCopy();
    else this.keepCopy(document);
    if (this.current().is === 'stale') return;
    if (refused > 0) {
      this.current.set({ is: 'held', fields: refused });
    } else if (standing) {
      this.current.update((state) => (state.is === 'saved' ? state : { is: 'saved', at: null }));
    } else {
      this.current.set({ is: 'waiting' });
      this.due.next(QUIET);
    }
  }

  /** Now, instead of when the next try is due. */
  retry(): void {
    const { is } = this.current();
    if (is === 'trying' || is === 'refused' || is === 'signed-out') {
      this.current.set({ is: 'waiting' });
      this.due.next(0);
    }
  }

  /** Somebody else's save stands; ours is given up (undo still has it). */
  takeTheirs(theirs: Revision): void {
    this.follow(theirs);
    this.current.set({ is: 'saved', at: new Date(theirs.changedAt) });
    this.dropCopy();
  }

  /** Ours goes over theirs, knowingly. */
  saveOver(theirs: Revision): void {
    this.version = theirs.version;
    this.current.set({ is: 'waiting' });
    this.due.next(0);
  }

  private lookForCopy({ id, revision }: Part, person: string): void {
    const copy = this.copies.read(person, id, revision.letter);
    const differs = copy !== null && JSON.stringify(copy.document) !== JSON.stringify(revision.document);
    this.found.set(differs ? copy : null);
    if (differs) this.copies.setAside(person, id, revision.letter, copy);
    else this.copies.dropAside(person, id, revision.letter);
    this.dropCopy();
  }

  private follow(revision: Revision): void {
    this.version = revision.version;
    this.confirmed = revision.document;
    this.wanted = revision.document;
  }

  private send(): void {
    const document = this.wanted;
    const target = this.target;
    const { is } = this.current();
    if (!document || !target || this.underway || (is !== 'waiting' && is !== 'trying')) return;
    this.underway = true;
    this.current.set({ is: 'saving' });
    this.server.saveRevision(target.id, target.letter, { version: this.version, document }).subscribe({
      next: (revision) => {
        if (this.target === target) this.saved(document, revision);
        else this.copies.drop(target.person, target.id, target.letter);
      },
      error: (error: unknown) => {
        // The local copy of a part that is no longer open is offered when it is opened again.
        if (this.target === target) this.failed(error);
      },
    });
  }

  private saved(document: PartDocument, revision: Revision): void {
    this.underway = false;
    this.failures = 0;
    this.version = revision.version;
    this.confirmed = document;
    if (this.wanted === document) {
      this.current.set({ is: 'saved', at: new Date(revision.changedAt) });
      this.dropCopy();
    } else if (this.wanted) {
      this.keepCopy(this.wanted);
      if (this.current().is !== 'held') {
        this.current.set({ is: 'waiting' });
        this.due.next(QUIET);
      }
    }
  }

  private failed(error: unknown): void {
    this.underway = false;
    const held = this.current().is === 'held';
    if (!(error instanceof ServerProblem)) {
      this.current.set({ is: 'refused', why: 'something went wrong here.', errors: [] });
      throw error;
    }
    if (error.is('stale')) this.current.set({ is: 'stale', theirs: error.current as Revision });
    else if (held) return;
    else if (error.status === 401) this.current.set({ is: 'signed-out' });
    else if (error.kind === 'unreachable' || error.status >= 500 || error.status === 429) this.tryLater(error);
    else this.current.set({ is: 'refused', why: error.message, errors: error.errors });
  }

  private tryLater(error: ServerProblem): void {
    const asked = (error.retryAfter ?? 0) * 1000;
    const wait = Math.max(asked, Math.min(LAST_RETRY, FIRST_RETRY * 2 ** this.failures));
    this.failures += 1;
    this.current.set({ is: 'trying', why: error.message, seconds: Math.round(wait / 1000) });
    this.due.next(wait);
  }

  private keepCopy(document: PartDocument): void {
    if (!this.target) return;
    const { person, id, letter } = this.target;
    const keptAt = new Date().toISOString();
    this.kept = this.copies.keep(person, id, letter, { document, version: this.version, keptAt });
  }

  private dropCopy(): void {
    if (this.target) this.copies.drop(this.target.person, this.target.id, this.target.letter);
  }
}
