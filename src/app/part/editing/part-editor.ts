import { computed, inject, Injectable, linkedSignal, signal } from '@angular/core';
import type { Part } from '@shared/contracts/parts';
import { isJoggle, isLeg, type PartDocument, type Unit } from '@shared/part/document';
import { printTypedChain } from '@shared/part/typed-chain';
import type { SolveResult, Solved } from '@shared/result';
import { solve } from '@shared/solve';
import { convertLength } from '@shared/units/length';
import { formatLength } from '@shared/units/format';
import { Autosave } from '../saving/autosave';
import type { History } from './history';
import { begin, cancelGesture, change, endGesture, redo, undo } from './history';

export type Edit = (document: PartDocument) => PartDocument;

const EMPTY: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: '',
  allowance: { method: 'handbook' },
  chain: [],
};

/** The open part: one immutable document, everything else computed from it. */
@Injectable()
export class PartEditor {
  private readonly autosave = inject(Autosave);
  private readonly opened = signal<Part | null>(null);
  private readonly history = signal<History<PartDocument>>(begin(EMPTY));
  private readonly picked = signal<number | null>(null);
  private readonly unitShown = signal<Unit | null>(null);
  private readonly typed = signal<string | null>(null);

  readonly part = this.opened.asReadonly();
  readonly mayEdit = signal(false);
  /** What stands in the box of the typed chain and is not taken; null while it shows the chain of the document. */
  readonly typedChain = this.typed.asReadonly();
  readonly document = computed(() => this.history().present);
  readonly result = computed<SolveResult>(() => solve(this.document()));
  /** The newest result with figures; while something typed is broken, that of before, never that of another part. */
  readonly drawn = linkedSignal<{ result: SolveResult; part: Part | null }, Solved | null>({
    source: () => ({ result: this.result(), part: this.opened() }),
    computation: ({ result, part }, former) => {
      if (result.ok) return result;
      return former && former.source.part === part ? former.value : (part?.revision.result ?? null);
    },
  });
  /** Words in the box of the typed chain that the part does not have yet. */
  private readonly chainWaits = computed(() => {
    const typed = this.typed();
    return typed !== null && typed !== printTypedChain(this.document().chain);
  });
  /** Whether figures and drawings are those of everything that stands typed on the page. */
  readonly isCurrent = computed(() => this.result().ok && !this.chainWaits());
  readonly whyNotCurrent = computed(() =>
    this.result().ok ? 'not current: the typed chain is not taken yet' : 'not current: a field is to be mended',
  );
  readonly canUndo = computed(() => this.mayEdit() && this.history().past.length > 0);
  readonly canRedo = computed(() => this.mayEdit() && this.history().future.length > 0);

  readonly counts = computed(() => {
    const { chain } = this.document();
    const legs = chain.filter(isLeg).length;
    const bends = chain.reduce((sum, entry) => sum + (isLeg(entry) ? 0 : isJoggle(entry) ? 2 : 1), 0);
    return { legs, bends };
  });

  /** What is wrong, by the path of the field; what the server found last, if we did not find it first. */
  readonly messages = computed<ReadonlyMap<string, string>>(() => {
    const result = this.result();
    const state = this.autosave.state();
    const errors = !result.ok ? result.errors : state.is === 'refused' ? state.errors : [];
    return new Map(errors.map((error) => [error.path, error.message]));
  });

  /** Entry of the chain that ledger and both decks show as selected. */
  readonly selection = computed(() => {
    const index = this.picked();
    return index !== null && index < this.document().chain.length ? index : null;
  });

  /** Unit that figures are shown in; what is typed is always in the part's own. */
  readonly shownUnit = computed<Unit>(() => this.unitShown() ?? this.document().unit);
  readonly figureOf = computed(() => {
    const [from, to] = [this.drawn()?.unit ?? this.document().unit, this.shownUnit()];
    return (length: number): string => formatLength(convertLength(length, from, to), to);
  });

  open(part: Part, person: string, mayEdit: boolean): void {
    this.opened.set(part);
    this.mayEdit.set(mayEdit);
    this.picked.set(null);
    this.typed.set(null);
    this.history.set(begin(part.revision.document));
    this.autosave.open(part, person);
  }

  select(index: number | null): void {
    this.picked.set(index);
  }

  showIn(unit: Unit): void {
    this.unitShown.set(unit);
  }

  /** @param gesture changes under one name are one entry of the history until the gesture ends */
  apply(edit: Edit, gesture: string | null = null): void {
    if (this.mayEdit()) this.step((history) => change(history, edit(history.present), gesture));
  }

  typeChain(text: string | null): void {
    this.typed.set(text);
    this.autosave.typed(text === printTypedChain(this.document().chain) ? null : text);
  }

  endGesture(): void {
    this.history.update(endGesture);
  }

  cancelGesture(): void {
    this.step(cancelGesture);
  }

  undo(): void {
    if (this.canUndo()) this.step(undo);
  }

  redo(): void {
    if (this.canRedo()) this.step(redo);
  }

  /** After a clash with somebody else's save: their document in place of ours, which undo brings back. */
  takeTheirs(): void {
    const state = this.autosave.state();
    if (state.is !== 'stale') return;
    const { theirs } = state;
    this.autosave.takeTheirs(theirs);
    this.apply(() => theirs.document);
  }

  saveOver(): void {
    const state = this.autosave.state();
    if (state.is !== 'stale') return;
    this.autosave.saveOver(state.theirs);
    this.tell();
  }

  private step(move: (history: History<PartDocument>) => History<PartDocument>): void {
    const before = this.document();
    // Asked for now, so that there is something to show should the next document be broken.
    this.drawn();
    this.history.update(move);
    if (this.document() !== before) this.tell();
  }

  private tell(): void {
    const result = this.result();
    this.autosave.changed(this.document(), result.ok ? 0 : result.errors.length);
  }
}
