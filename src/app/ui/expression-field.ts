import {
  afterNextRender,
  afterRenderEffect,
  ChangeDetectionStrategy,
  Component,
  computed,
  type ElementRef,
  inject,
  Injector,
  input,
  output,
  signal,
  viewChild,
} from '@angular/core';
import type { Expression } from '@shared/part/document';
import { announceAfterPause } from './announce-after-pause';
import { isFraction, typedExpression } from './typed-expression';

let count = 0;

/** A box for a figure or an expression: what it comes to stands beside it, what is wrong under it. */
@Component({
  selector: 'lw-expression-field',
  template: `
    <input
      #box
      type="text"
      inputmode="text"
      autocomplete="off"
      autocapitalize="off"
      spellcheck="false"
      maxlength="500"
      [id]="id"
      [attr.aria-label]="label()"
      [attr.aria-invalid]="message() !== null"
      [attr.aria-describedby]="describedBy()"
      [attr.data-cell]="cell()"
      [readonly]="readOnly()"
      [value]="text()"
      (input)="type(box.value)"
      (focus)="enter()"
      (blur)="leave()"
      (keydown.escape)="cancel($event)"
    />
    @if (suffix() && reading() === null) {
      <span class="suffix" aria-hidden="true">{{ suffix() }}</span>
    }
    @if (message() !== null && messageAt() === null) {
      <span class="message" [id]="id + '-message'">{{ message() }}</span>
    } @else if (message() === null && reading() !== null) {
      <span class="understood" [class.quiet]="quiet()" [id]="id + '-understood'">= {{ reading() }}</span>
    }
  `,
  styleUrl: './expression-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.broken]': 'message() !== null' },
})
export class ExpressionField {
  readonly value = input.required<Expression>();
  readonly label = input.required<string>();
  readonly message = input<string | null>(null);
  /** Id of the element that shows the message, where there is no room for it under the box. */
  readonly messageAt = input<string | null>(null);
  /** What an expression comes to; null when it says so itself. */
  readonly understood = input<string | null>(null);
  readonly suffix = input('');
  readonly readOnly = input(false);
  /** Column of the ledger that the arrow keys stay in. */
  readonly cell = input<string | null>(null);
  readonly typed = output<string>();
  readonly done = output();
  readonly cancelled = output();

  protected readonly id = `lw-expression-${++count}`;
  private readonly injector = inject(Injector);
  private readonly box = viewChild.required<ElementRef<HTMLInputElement>>('box');

  /** Entered, and nothing typed since: the next key replaces the figure. */
  private untouched = false;
  /** What is being typed, or null when the box shows what the part has. */
  private readonly typing = signal<string | null>(null);

  /** What stands in the box is left alone while it still means the same: "0,7" is on the way to "0,75". */
  protected readonly text = computed(() => {
    const typing = this.typing();
    return typing !== null && typedExpression(typing) === this.value() ? typing : String(this.value());
  });

  /** What stands in the box as it was understood, where that is not plain to see. */
  protected readonly reading = computed(() => {
    const value = String(this.value());
    return this.understood() ?? (this.text().trim() === value ? null : value);
  });

  /** A fraction is read at sight; what it comes to is shown while somebody is at it. */
  protected readonly quiet = computed(() => isFraction(this.value()));

  protected readonly describedBy = computed(() => {
    if (this.message() !== null) return this.messageAt() ?? `${this.id}-message`;
    return this.reading() === null ? null : `${this.id}-understood`;
  });

  constructor() {
    const words = computed(() => (this.message() === null ? null : `${this.label()}: ${this.message()}`));
    announceAfterPause(words, this.text);
    // A box that was left a moment ago may change this one's figure just after it was entered (the typed chain does): written
    // there it would drop the selection, and the next key would add to the figure instead of replacing it.
    afterRenderEffect(() => {
      this.text();
      const box = this.box().nativeElement;
      if (this.untouched && document.activeElement === box) box.select();
    });
  }

  protected enter(): void {
    this.untouched = true;
    this.box().nativeElement.select();
  }

  protected type(text: string): void {
    this.untouched = false;
    this.typing.set(text);
    this.typed.emit(text);
  }

  protected leave(): void {
    this.untouched = false;
    this.typing.set(null);
    this.done.emit();
  }

  protected cancel(event: Event): void {
    event.stopPropagation();
    this.typing.set(null);
    this.cancelled.emit();
    // Once what it had stands in the box again: writing it there would drop the selection, and the next key would add to it.
    afterNextRender({ read: () => this.box().nativeElement.select() }, { injector: this.injector });
  }
}
