import { DestroyRef, DOCUMENT, effect, inject, Injectable, signal, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { Part } from '@shared/contracts/parts';
import type { Revision } from '@shared/contracts/revisions';
import type { PartDocument } from '@shared/part/document';
import { fromEvent, Subject, switchMap, timer } from 'rxjs';
import { Reachability } from '../../server/reachability';
import { Server } from '../../server/server';
import { ServerProblem } from '../../server/server-problem';
import { DraftVisit } from './draft-visit';
import { LeavingSaves } from './leaving-saves';
import { LeftBehind } from './left-behind';
import { LocalCopies } from './local-copies';
import { OpenVisits } from './open-visits';
import type { SaveState } from './save-state';

const QUIET = 800;
const FIRST_RETRY = 2_000;
const LAST_RETRY = 30_000;

/** Saves the document a moment after the last change: one request at a time, a local copy until the server confirms. */
@Injectable()
export class Autosave {
  private readonly server = inject(Server);
  private readonly copies = inject(LocalCopies);
  private readonly visits = inject(OpenVisits);
  private readonly leavingSaves = inject(LeavingSaves);
  private readonly left = inject(LeftBehind);
  private readonly current = signal<SaveState>({ is: 'saved', at: null });
  private readonly typedChain = signal<string | null>(null);
  private readonly kept = signal(true);
  private readonly due = new Subject<number>();
  private visit: DraftVisit | null = null;

  readonly state = this.current.asReadonly();
  /** A typed chain that is not taken: no part of what is saved. */
  readonly untaken = this.typedChain.asReadonly();
  /** False when the browser would not keep a copy of what is not saved. */
  readonly keepsCopy = this.kept.asReadonly();
  /** A copy of work that an earlier visit could not save, when it differs from what the server has. */
  readonly leftBehind = this.left.copy;

  constructor() {
    const window = inject(DOCUMENT).defaultView;
    const reachability = inject(Reachability);
    // A later wish replaces an earlier one: typing puts the save off, a retry is overtaken by the next edit.
    this.due
      .pipe(
        switchMap((delay) => timer(delay)),
        takeUntilDestroyed(),
      )
      .subscribe(() => {
        if (this.visit && this.isDue()) this.send(this.visit);
      });
    if (window) {
      fromEvent(window, 'online')
        .pipe(takeUntilDestroyed())
        .subscribe(() => this.retry());
    }
    effect(() => {
      if (reachability.reachable() && untracked(this.current).is === 'trying') untracked(() => this.retry());
    });
    inject(DestroyRef).onDestroy(() => this.leave());
  }

  /** True while a closed window would lose work: not saved, and no local copy either. */
  get atRisk(): boolean {
    return !this.kept() && (this.current().is !== 'saved' || this.typedChain() !== null);
  }

  open(part: Part, person: string): void {
    this.leave();
    this.visit = new DraftVisit(part, person, this.visits.begin());
    this.kept.set(true);
    this.typedChain.set(null);
    this.current.set({ is: 'saved', at: this.visit.savedAt });
    void this.left.look(part, person);
  }

  /** The work of an earlier visit has been taken up again or given up. */
  settleCopy(): void {
    this.left.settle();
    // There may be room for ours now.
    if (this.visit && !this.kept()) this.remember(this.visit);
  }

  /** @param refused number of fields that the engine refuses */
  changed(document: PartDocument, refused: number): void {
    const { visit } = this;
    if (!visit) return;
    visit.wanted = document;
    visit.fit = refused === 0;
    this.remember(visit);
    if (this.current().is === 'stale') return;
    if (refused > 0) this.current.set({ is: 'held', fields: refused });
    else if (visit.standing) this.current.set({ is: 'saved', at: visit.savedAt });
    else this.wait(QUIET);
  }

  /** @param text what stands in the box and is not taken, or null */
  typed(text: string | null): void {
    if (!this.visit || this.visit.typed === text) return;
    this.visit.typed = text;
    this.typedChain.set(text);
    this.remember(this.visit);
  }

  /** Now, instead of when the next try is due. */
  retry(): void {
    const { is } = this.current();
    if (is === 'trying' || is === 'refused' || is === 'signed-out') this.wait(0);
  }

  /** Somebody else's save stands; ours is given up (undo still has it). */
  takeTheirs(theirs: Revision): void {
    if (!this.visit) return;
    this.visit.follow(theirs);
    this.visit.fit = true;
    this.current.set({ is: 'saved', at: this.visit.savedAt });
    this.remember(this.visit);
  }

  /** Ours goes over theirs, knowingly. */
  saveOver(theirs: Revision): void {
    if (!this.visit) return;
    this.visit.stands(theirs.document, theirs);
    this.wait(0);
  }

  private isDue(): boolean {
    const { is } = this.current();
    return is === 'waiting' || is === 'trying';
  }

  private wait(delay: number): void {
    this.current.set({ is: 'waiting' });
    this.due.next(delay);
  }

  /** What is still wanted is sent on its own account, also after the save that is on its way. */
  private leave(): void {
    const { visit } = this;
    if (!visit) return;
    const due = this.isDue();
    this.visit = null;
    visit.finish = this.leavingSaves.begin(visit.stay.part);
    if (due) this.send(visit);
    if (!visit.underway) this.ended(visit);
  }

  private ended(visit: DraftVisit): void {
    this.visits.end(visit.stay.visit);
    visit.finish?.();
  }

  private send(visit: DraftVisit): void {
    if (visit.underway) return;
    const document = visit.next;
    visit.underway = true;
    if (visit === this.visit) this.current.set({ is: 'saving' });
    const { part, letter } = visit.stay;
    this.server.saveRevision(part, letter, { version: visit.version, document }).subscribe({
      next: (revision) => this.saved(visit, document, revision),
      error: (error: unknown) => this.failed(visit, document, error),
    });
  }

  private saved(visit: DraftVisit, document: PartDocument, revision: Revision): void {
    visit.underway = false;
    visit.failures = 0;
    visit.stands(document, revision);
    this.remember(visit);
    if (visit === this.visit) this.goOn(visit);
    else if (visit.fit && !visit.standing) this.send(visit);
    else this.ended(visit);
  }

  private goOn(visit: DraftVisit): void {
    if (visit.standing) this.current.set({ is: 'saved', at: visit.savedAt });
    else if (visit.fit) this.wait(QUIET);
  }

  private failed(visit: DraftVisit, document: PartDocument, error: unknown): void {
    visit.underway = false;
    if (error instanceof ServerProblem) this.learn(visit, document, error);
    // The local copy of a part that is no longer open is offered when it is opened again.
    if (visit !== this.visit) this.ended(visit);
    else if (error instanceof ServerProblem) this.explain(visit, document, error);
    else this.current.set({ is: 'refused', why: 'something went wrong here.', errors: [] });
    if (!(error instanceof ServerProblem)) throw error;
  }

  /** What a failure tells about what the server has. */
  private learn(visit: DraftVisit, document: PartDocument, error: ServerProblem): void {
    if (isPassing(error)) visit.unanswered = document;
    // Whoever is turned away at the door learns nothing about an earlier save.
    else if (error.status !== 401 && error.status !== 403) visit.unanswered = null;
    if (error.is('stale')) visit.confirmed = (error.current as Revision).document;
    this.remember(visit);
  }

  private explain(visit: DraftVisit, document: PartDocument, error: ServerProblem): void {
    const newer = visit.wanted !== document;
    if (error.is('stale')) this.current.set({ is: 'stale', theirs: error.current as Revision });
    else if (!visit.fit) return;
    else if (error.status === 401) this.current.set({ is: 'signed-out' });
    else if (isPassing(error)) this.tryLater(visit, error);
    else if (newer && (error.status === 413 || error.status === 422)) this.goOn(visit);
    else this.current.set({ is: 'refused', why: error.message, errors: error.errors });
  }

  private tryLater(visit: DraftVisit, error: ServerProblem): void {
    const asked = (error.retryAfter ?? 0) * 1000;
    const wait = Math.max(asked, Math.min(LAST_RETRY, FIRST_RETRY * 2 ** visit.failures));
    visit.failures += 1;
    this.current.set({ is: 'trying', why: error.message, seconds: Math.round(wait / 1000) });
    this.due.next(wait);
  }

  /** Keeps in this browser what the server does not have, and nothing else. */
  private remember(visit: DraftVisit): void {
    const { standing, typed, stay, version } = visit;
    const document = standing ? null : visit.wanted;
    if (document === null && typed === null) {
      this.copies.drop(stay);
      return;
    }
    const kept = this.copies.keep(stay, { document, typed, version, keptAt: new Date().toISOString() });
    if (visit === this.visit) this.kept.set(kept);
  }
}

/** The same save may well be taken later; or it has been, and only its answer was lost. */
const isPassing = (error: ServerProblem): boolean =>
  error.kind === 'unreachable' || error.status >= 500 || error.status === 429;
