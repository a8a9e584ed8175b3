import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  inject,
  Injector,
  input,
  output,
  viewChild,
} from '@angular/core';

/** A box for the name of a leg or a bend; Escape gives back the name it had. */
@Component({
  selector: 'lw-name-box',
  template: `
    <input
      #box
      type="text"
      autocomplete="off"
      maxlength="80"
      [attr.aria-label]="label()"
      [attr.data-cell]="cell()"
      [placeholder]="placeholder()"
      [readonly]="readOnly()"
      [value]="value()"
      [title]="value()"
      (input)="typed.emit(box.value)"
      (blur)="done.emit()"
      (keydown.escape)="cancel($event)"
    />
  `,
  styleUrl: './name-box.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NameBox {
  readonly value = input.required<string>();
  readonly label = input.required<string>();
  readonly placeholder = input.required<string>();
  readonly readOnly = input(false);
  /** Column of the ledger that the arrow keys stay in. */
  readonly cell = input<string | null>(null);
  readonly typed = output<string>();
  readonly done = output();
  readonly cancelled = output();

  private readonly injector = inject(Injector);
  private readonly box = viewChild.required<ElementRef<HTMLInputElement>>('box');

  protected cancel(event: Event): void {
    event.stopPropagation();
    this.cancelled.emit();
    // Once what it had stands in the box again: writing it there would drop the selection, and the next key would add to it.
    afterNextRender({ read: () => this.box().nativeElement.select() }, { injector: this.injector });
  }
}
