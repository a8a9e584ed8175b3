import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

export interface Outline {
  readonly path: string;
  /** x, y, width, height, y up. */
  readonly box: readonly number[];
}

/** The formed section as it is: true radii and thickness, whole in its frame. Decoration beside words that say the same. */
@Component({
  selector: 'lw-section-drawing',
  template: `
    @if (frame(); as frame) {
      <svg [attr.viewBox]="frame.viewBox" preserveAspectRatio="xMidYMid meet" aria-hidden="true">
        <path [attr.d]="frame.path" transform="scale(1 -1)" />
      </svg>
    } @else {
      <span class="none" aria-hidden="true">—</span>
    }
  `,
  styles: `
    :host {
      position: relative;
      display: grid;
      place-items: center;
    }

    svg {
      position: absolute;
      inset: 0;
      width: 100%;
      height: 100%;
      overflow: visible;
    }

    path {
      fill: var(--lw-sheet);
      stroke: var(--lw-edge);
      stroke-width: var(--section-edge, 1px);
      stroke-linejoin: round;
      vector-effect: non-scaling-stroke;
    }

    .none {
      color: var(--lw-ink-2);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SectionDrawing {
  readonly outline = input.required<Outline | null>();

  protected readonly frame = computed(() => {
    const outline = this.outline();
    if (outline === null) return null;
    const [x = 0, y = 0, width = 0, height = 0] = outline.box;
    return { path: outline.path, viewBox: `${x} ${-(y + height)} ${width} ${height}` };
  });
}
