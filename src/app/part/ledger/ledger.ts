import {
  afterNextRender,
  afterRenderEffect,
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  ElementRef,
  inject,
  Injector,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { isBend, isJoggle, isLeg } from '@shared/part/document';
import { type Command, commandOf } from '../editing/commands';
import { PartEditor } from '../editing/part-editor';
import { BendRow } from './bend-row';
import { JoggleRow } from './joggle-row';
import { LegRow } from './leg-row';

type Row =
  | { readonly kind: 'leg'; readonly index: number; readonly number: number }
  | { readonly kind: 'bend' | 'joggle'; readonly index: number; readonly number: number };

const VALUE = 'input[data-cell="value"]';

/** The chain as a list: leg, bend, leg, …; typed straight down with the keyboard alone. */
@Component({
  selector: 'lw-ledger',
  imports: [BendRow, JoggleRow, LegRow, MatButtonModule],
  templateUrl: './ledger.html',
  styleUrl: './ledger.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(focusin)': 'select($event)', '(click)': 'select($event)' },
})
export class Ledger {
  protected readonly editor = inject(PartEditor);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly injector = inject(Injector);

  protected readonly addAtStart = commandOf('add-at-start');
  protected readonly addAtEnd = commandOf('add-at-end');

  /** Legs are counted from 1; bends are numbered as their lines are, a joggle by the first of its two. */
  protected readonly rows = computed((): Row[] => {
    let legs = 0;
    let bends = 1;
    return this.editor.document().chain.map((entry, index): Row => {
      if (isLeg(entry)) return { kind: 'leg', index, number: ++legs };
      const number = bends;
      bends += isJoggle(entry) ? 2 : 1;
      return { kind: isBend(entry) ? 'bend' : 'joggle', index, number };
    });
  });

  constructor() {
    afterRenderEffect({ write: () => this.bringIntoView(this.editor.selection()) });
    effect(() => this.holdFocus(this.rows().length, this.editor.selection()));
  }

  protected add(command: Command): void {
    command.run(this.editor);
    this.goOn();
  }

  /** The box that was in use is gone or done with: on in the row that is selected now. */
  goOn(): void {
    afterNextRender({ read: () => this.focusRow(this.editor.selection()) }, { injector: this.injector });
  }

  /** Whatever is clicked or comes into focus selects its row. */
  protected select(event: Event): void {
    const row = event.target instanceof Element ? event.target.closest('[data-row]') : null;
    if (row) this.editor.select(Number(row.getAttribute('data-row')));
  }

  /** Enter goes down to the next figure, the arrows stay in their column; Tab reaches everything, as it does anywhere. */
  protected move(event: KeyboardEvent): void {
    const target = event.target;
    if (!(target instanceof HTMLInputElement) || event.ctrlKey || event.metaKey || event.altKey) return;
    const column = target.getAttribute('data-cell');
    if (column === null) return;
    const down = event.key === 'ArrowDown';
    if (down || event.key === 'ArrowUp') this.go(event, target, column, down ? 1 : -1);
    else if (event.key === 'Enter') this.go(event, target, 'value', event.shiftKey ? -1 : 1);
  }

  /**
   * A row may go while it has the focus, as by undo, and so may what a row shows only while it is selected. Asked for before
   * the rows are drawn anew; the focus that has gone with them goes to the row that stands there then.
   */
  private holdFocus(rows: number, selection: number | null): void {
    const held = document.activeElement;
    if (held === null || !this.host.nativeElement.contains(held)) return;
    const row = held.closest('[data-row]')?.getAttribute('data-row');
    const nearest = Math.min(Number(row ?? rows - 1), rows - 1);
    const mend = (): void => {
      if (!held.isConnected && document.activeElement === document.body) this.focusRow(selection ?? nearest);
    };
    afterNextRender({ read: mend }, { injector: this.injector });
  }

  private focusRow(index: number | null): void {
    this.rowAt(index)?.querySelector<HTMLInputElement>(VALUE)?.focus();
  }

  private rowAt(index: number | null): HTMLElement | null {
    return index === null ? null : this.host.nativeElement.querySelector(`[data-row="${index}"]`);
  }

  /** A bend picked in a drawing is shown in its row: by scrolling the ledger in its frame, never the page. */
  private bringIntoView(index: number | null): void {
    const row = this.rowAt(index);
    const frame = this.host.nativeElement.parentElement;
    if (!row || !frame || frame.scrollHeight <= frame.clientHeight) return;
    const [inner, outer] = [row.getBoundingClientRect(), frame.getBoundingClientRect()];
    if (inner.top < outer.top) frame.scrollTop -= outer.top - inner.top;
    else if (inner.bottom > outer.bottom) frame.scrollTop += inner.bottom - outer.bottom;
  }

  /** Where there is no further row the key does what it does anywhere. */
  private go(event: Event, from: HTMLElement, column: string, step: 1 | -1): void {
    const rows = [...this.host.nativeElement.querySelectorAll('[data-row]')];
    const at = rows.findIndex((row) => row.contains(from));
    for (let next = at + step; next >= 0 && next < rows.length; next += step) {
      const cell = rows[next]?.querySelector<HTMLInputElement>(`input[data-cell="${column}"]`);
      if (!cell) continue;
      event.preventDefault();
      cell.focus();
      cell.select();
      return;
    }
  }
}
