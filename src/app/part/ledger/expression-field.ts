import { ChangeDetectionStrategy, Component, computed, type ElementRef, input, output, viewChild } from '@angular/core';
import type { Expression } from '@shared/part/document';
import { isFraction } from '../editing/typed-expression';

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
      (input)="typed.emit(box.value)"
      (focus)="box.select()"
      (blur)="done.emit()"
      (keydown.escape)="cancel($event)"
    />
    @if (suffix() && !understood()) {
      <span class="suffix" aria-hidden="true">{{ suffix() }}</span>
    }
    @if (message() !== null && messageAt() === null) {
      <span class="message" role="alert" [id]="id + '-message'">{{ message() }}</span>
    } @else if (message() === null && understood() !== null) {
      <span class="understood" [class.quiet]="quiet()" [id]="id + '-understood'">= {{ understood() }}</span>
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
  private readonly box = viewChild.required<ElementRef<HTMLInputElement>>('box');

  /** A fraction is read at sight; what it comes to is shown while somebody is at it. */
  protected readonly quiet = computed(() => isFraction(this.value()));

  protected readonly describedBy = computed(() => {
    if (this.message() !== null) return this.messageAt() ?? `${this.id}-message`;
    return this.understood() === null ? null : `${this.id}-understood`;
  });

  /** What stands in the box is left alone while it still means the same: "1." is on the way to "1.5". */
  protected readonly text = computed(() => String(this.value()));

  protected cancel(event: Event): void {
    event.stopPropagation();
    this.cancelled.emit();
    this.box().nativeElement.select();
  }
}
