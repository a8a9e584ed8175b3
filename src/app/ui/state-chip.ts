import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

const WORDS = { draft: 'Draft' } as const;

/** State of a revision, in words; the colour only repeats them. */
@Component({
  selector: 'lw-state-chip',
  template: '{{ words() }}',
  styles: `
    :host {
      display: inline-block;
      padding: 1px 8px;
      border: 1px solid var(--lw-control);
      border-radius: 4px;
      color: var(--lw-ink-2);
      font-size: 12.5px;
      font-weight: 500;
      line-height: 18px;
      white-space: nowrap;
    }

    :host(.draft) {
      border-style: dashed;
    }
  `,
  host: { '[class]': 'state()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StateChip {
  readonly state = input.required<keyof typeof WORDS>();
  protected readonly words = computed(() => WORDS[this.state()]);
}
