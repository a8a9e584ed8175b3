import {
  afterRenderEffect,
  ChangeDetectionStrategy,
  Component,
  type ElementRef,
  input,
  output,
  viewChild,
  ViewEncapsulation,
} from '@angular/core';
import { type Drawing, NO_OVERLAY } from './marks';
import { Paper } from './paint';

/** A drawing on the page. What it says in words is the caller's to give: as `label` here and as text beside it. */
@Component({
  selector: 'lw-drawing-view',
  template: '<svg #paper role="img" class="drawing" [attr.aria-label]="label()"></svg>',
  styleUrl: './drawing-view.scss',
  // The marks are made by svg.js and carry no attribute of this component.
  encapsulation: ViewEncapsulation.None,
  changeDetection: ChangeDetectionStrategy.OnPush,
  // Whatever a click selects here, the ledger selects by keyboard.
  host: { class: 'lw-drawing', '[class.flat]': 'flat()', '(click)': 'choose($event)' },
})
export class DrawingView {
  readonly drawing = input.required<Drawing>();
  readonly label = input.required<string>();
  /** The entry of the chain that is marked, and what is laid over the drawing for it. */
  readonly selected = input<number | null>(null);
  readonly overlay = input(NO_OVERLAY);
  /** The metal is seen flat, not cut. */
  readonly flat = input(false);
  /** The entry of the chain that was clicked, or null beside all of them. */
  readonly pick = output<number | null>();

  private readonly paper = viewChild.required<ElementRef<SVGSVGElement>>('paper');

  constructor() {
    let paper: Paper | null = null;
    afterRenderEffect({ write: () => (paper ??= new Paper(this.paper().nativeElement)).draw(this.drawing()) });
    afterRenderEffect({
      write: () => {
        // After every drawing too: it begins with nothing marked.
        this.drawing();
        paper?.select(this.selected(), this.overlay());
      },
    });
  }

  protected choose(event: MouseEvent): void {
    const marked = event.target instanceof Element ? event.target.closest('[data-pick]') : null;
    const entry = marked?.getAttribute('data-pick') ?? null;
    this.pick.emit(entry === null ? null : Number(entry));
  }
}
