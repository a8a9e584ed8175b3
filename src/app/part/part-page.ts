import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
  untracked,
  viewChild,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { Title } from '@angular/platform-browser';
import { RouterLink } from '@angular/router';
import type { Part } from '@shared/contracts/parts';
import { UNIT_WORDS } from '@shared/part/words';
import { firstValueFrom } from 'rxjs';
import { Server } from '../server/server';
import { ServerProblem } from '../server/server-problem';
import { SessionStore } from '../session/session-store';
import { BlankDeck } from './decks/blank-deck';
import { FormedDeck } from './decks/formed-deck';
import { commandFor, isHistoryKey, keyOf } from './editing/commands';
import { PartEditor } from './editing/part-editor';
import { FiguresStrip } from './figures/figures-strip';
import { findingCounts } from './figures/gathered-findings';
import { FindingsList } from './figures/findings-list';
import { StationsTable } from './figures/stations-table';
import { Ledger } from './ledger/ledger';
import { PartHeader } from './part-header';
import { Autosave } from './saving/autosave';
import { LeavingSaves } from './saving/leaving-saves';
import { LeftBehind } from './saving/left-behind';
import { SavingNotices } from './saving/saving-notices';
import { PartSettings } from './settings/part-settings';
import { SheetSummary } from './settings/sheet-summary';
import { TypedChainBox } from './typed-chain/typed-chain-box';

type PageState =
  | { readonly is: 'loading' }
  | { readonly is: 'open' }
  | { readonly is: 'not-found' }
  | { readonly is: 'failed'; readonly why: string };

/** One part: ledger, both decks, figures and findings round one document. */
@Component({
  selector: 'lw-part-page',
  imports: [
    BlankDeck,
    FiguresStrip,
    FindingsList,
    FormedDeck,
    Ledger,
    MatButtonModule,
    MatProgressBarModule,
    PartHeader,
    PartSettings,
    RouterLink,
    SavingNotices,
    SheetSummary,
    StationsTable,
    TypedChainBox,
  ],
  providers: [Autosave, LeftBehind, PartEditor],
  templateUrl: './part-page.html',
  styleUrl: './part-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    '(document:keydown)': 'key($event)',
    '(window:beforeunload)': 'leaving($event)',
  },
})
export class PartPage {
  readonly id = input.required<string>();

  private readonly server = inject(Server);
  private readonly session = inject(SessionStore);
  private readonly autosave = inject(Autosave);
  private readonly leavingSaves = inject(LeavingSaves);
  private readonly title = inject(Title);

  private readonly ledger = viewChild(Ledger);

  protected readonly editor = inject(PartEditor);
  protected readonly unitWords = UNIT_WORDS;
  protected readonly state = signal<PageState>({ is: 'loading' });

  protected readonly findingCounts = computed(() => {
    const solved = this.editor.drawn();
    return solved ? findingCounts(solved) : '';
  });

  constructor() {
    effect(() => {
      const id = this.id();
      untracked(() => void this.load(id));
    });
  }

  protected async load(id: string): Promise<void> {
    this.state.set({ is: 'loading' });
    try {
      // What an earlier visit is still sending would otherwise come as somebody else's save.
      const leaving = this.leavingSaves.settled(id);
      if (leaving) await leaving;
      const part = await firstValueFrom(this.server.part(id));
      if (id === this.id()) this.open(part);
    } catch (error) {
      if (!(error instanceof ServerProblem)) throw error;
      this.state.set(error.status === 404 ? { is: 'not-found' } : { is: 'failed', why: error.message });
    }
  }

  protected key(event: KeyboardEvent): void {
    if (event.defaultPrevented || this.state().is !== 'open') return;
    const target = event.target instanceof HTMLElement ? event.target : null;
    // A dialog over the page has its own keys, a box with words of its own its own undo.
    if (target?.closest('[role="dialog"], [role="menu"], [data-own-undo]')) return;
    const key = keyOf(event);
    const command = commandFor(key, this.editor, target);
    if (command || isHistoryKey(key)) event.preventDefault();
    if (!command) return;
    command.run(this.editor);
    if (command.goesOn) this.ledger()?.goOn();
  }

  protected leaving(event: BeforeUnloadEvent): void {
    if (this.autosave.atRisk) event.preventDefault();
  }

  private open(part: Part): void {
    const person = this.session.person();
    this.editor.open(part, person?.id ?? '', this.session.hasRole('designer'));
    this.title.setTitle(`${part.number} · Leafwright`);
    this.state.set({ is: 'open' });
  }
}
