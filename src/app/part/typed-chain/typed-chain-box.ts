import { ChangeDetectionStrategy, Component, computed, type ElementRef, inject, viewChild } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import type { ChainEntry } from '@shared/part/document';
import { replaceChain, whyChainStays } from '@shared/part/edits/replace-chain';
import { parseTypedChain, printTypedChain, type TypedChain } from '@shared/part/typed-chain';
import { solve } from '@shared/solve';
import { announceAfterPause } from '../../ui/announce-after-pause';
import { PartEditor } from '../editing/part-editor';
import { chainWords } from './chain-words';

const TAKES = 'Enter takes it.';

interface Reading {
  readonly chain: readonly ChainEntry[] | null;
  readonly errors: readonly { readonly start: number; readonly end: number; readonly message: string }[];
}

/** The whole chain in one line: judged while it is typed, taken on Enter or when the box is left. */
@Component({
  selector: 'lw-typed-chain-box',
  imports: [MatButtonModule],
  templateUrl: './typed-chain-box.html',
  styleUrl: './typed-chain-box.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TypedChainBox {
  protected readonly editor = inject(PartEditor);
  private readonly box = viewChild.required<ElementRef<HTMLTextAreaElement>>('box');

  /** What is being typed, or was and can't be taken; null when the box shows the chain as it stands. */
  protected readonly draft = this.editor.typedChain;
  protected readonly standing = computed(() => printTypedChain(this.editor.document().chain));
  protected readonly text = computed(() => this.draft() ?? this.standing());
  private readonly reading = computed((): Reading => {
    const draft = this.draft();
    return draft === null ? { chain: null, errors: [] } : this.read(draft);
  });
  protected readonly error = computed(() => this.reading().errors[0] ?? null);
  protected readonly pieces = computed(() => chainWords(this.text(), this.reading().errors));
  protected readonly pointed = computed(() => {
    const error = this.error();
    return error ? this.text().slice(error.start, error.end).trim() : '';
  });
  protected readonly isTaken = computed(() => this.draft() === null || this.draft() === this.standing());
  protected readonly takes = TAKES;

  constructor() {
    const words = computed(() => {
      const error = this.error();
      if (error) return `Typed chain: ${this.pointed()} ${error.message}`;
      return this.isTaken() ? null : TAKES;
    });
    announceAfterPause(words, this.text);
  }

  protected type(text: string): void {
    // One line, however it was pasted.
    this.editor.typeChain(text.replace(/\s*\n\s*/g, ' '));
  }

  protected enter(event: Event): void {
    event.preventDefault();
    const error = this.error();
    if (!error) this.take();
    else this.box().nativeElement.setSelectionRange(error.start, error.end);
  }

  /** A chain that can't be taken stays in the box, with what is wrong about it. */
  protected take(): void {
    const { chain, errors } = this.reading();
    if (!chain || errors.length > 0) return;
    if (this.draft() !== this.standing()) this.editor.apply((document) => replaceChain(document, chain));
    this.editor.typeChain(null);
  }

  protected putBack(): void {
    this.editor.typeChain(null);
    this.box().nativeElement.focus();
  }

  protected leave(event: Event): void {
    event.stopPropagation();
    this.putBack();
  }

  private read(text: string): Reading {
    const document = this.editor.document();
    const typed: TypedChain = parseTypedChain(text, document.chain);
    if (!typed.ok) return { chain: null, errors: typed.errors };
    const whole = (message: string) => ({ start: 0, end: text.length, message });
    const stays = whyChainStays(document, typed.chain);
    if (stays !== null) return { chain: null, errors: [whole(stays)] };
    // The engine's own errors about the chain, shown at the word that they are about; others are shown at their fields.
    const result = solve({ ...document, chain: typed.chain });
    if (result.ok) return { chain: typed.chain, errors: [] };
    const ours = result.errors.filter((error) => error.path.startsWith('chain'));
    const errors = ours.map(({ path, message }) => {
      const field = typed.fields.find((one) => one.path === path || path.startsWith(`${one.path}/`));
      const entry = typed.fields.find((one) => path.startsWith(one.path.replace(/[^/]+$/, '')));
      const place = field ?? entry;
      return place ? { start: place.start, end: place.end, message } : whole(message);
    });
    return { chain: typed.chain, errors };
  }
}
