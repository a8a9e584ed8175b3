import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** Stands at figures of before, while something typed is broken or not taken. The figures stay readable: only the words say it. */
@Component({
  selector: 'lw-not-current',
  template: '{{ why() }}',
  styles: `
    :host {
      color: var(--lw-red);
      font-size: 12.5px;
      font-weight: 600;
      line-height: 16px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotCurrent {
  readonly why = input.required<string>();
}
