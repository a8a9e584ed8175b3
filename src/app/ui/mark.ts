import { ChangeDetectionStrategy, Component } from '@angular/core';

/** Our mark: a sheet with one radius and one open bend, and the line it was bent on. */
@Component({
  selector: 'lw-mark',
  template: `
    <svg viewBox="0 0 32 32" width="100%" height="100%" fill="none" aria-hidden="true">
      <path class="sheet" d="M6 4v15a6 6 0 0 0 6 6h6.6a6 6 0 0 0 4.2-1.8L29 17" />
      <path class="line" d="M12.5 18.5 3.5 27.5" />
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
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Mark {}
