import { ChangeDetectionStrategy, Component } from '@angular/core';

/** Our mark: a sheet with one radius and one open bend, and the bend line it was laid out with. */
@Component({
  selector: 'lw-mark',
  template: `
    <svg viewBox="0 0 32 32" width="100%" height="100%" fill="none" aria-hidden="true">
      <path class="sheet" d="M4 6v13a6 6 0 0 0 6 6h6.5a6 6 0 0 0 5.2-3L29 9.5" />
      <path class="line" d="M10 13.5h6.5" />
    </svg>
  `,
  styles: `
    :host {
      display: inline-block;
      width: 28px;
      height: 28px;
      flex: none;
    }

    .sheet {
      fill: none;
      stroke: var(--lw-blue);
      stroke-width: 4;
    }

    .line {
      fill: none;
      stroke: var(--lw-ink-2);
      stroke-width: 1.6;
      stroke-dasharray: 3.5 1.5;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Mark {}
