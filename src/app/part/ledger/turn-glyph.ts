import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { Turn } from '@shared/part/document';

/** A small drawing of which way a bend turns; the word stands beside it. */
@Component({
  selector: 'lw-turn-glyph',
  template: '<svg width="20" height="18" viewBox="0 0 20 18" aria-hidden="true"><path [attr.d]="path()" /></svg>',
  styles: `
    svg {
      display: block;
      margin-top: 6px;
      fill: none;
      stroke: currentcolor;
      stroke-width: 2;
    }
    @media (pointer: coarse) {
      svg {
        margin-top: 13px;
      }
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TurnGlyph {
  readonly turn = input.required<Turn>();
  protected readonly path = computed(() => (this.turn() === 'up' ? 'M2 15h8c3 0 5-2 5-5V2' : 'M2 3h8c3 0 5 2 5 5v8'));
}
