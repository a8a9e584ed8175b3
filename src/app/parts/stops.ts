import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { Icon } from '../ui/icon';

/** How many stops the checks found; nothing when there are none. */
@Component({
  selector: 'lw-stops',
  imports: [Icon],
  template: `
    @if (count() > 0) {
      <lw-icon name="stop" />{{ count() === 1 ? '1 stop' : count() + ' stops' }}
    }
  `,
  styles: `
    :host {
      display: inline-flex;
      align-items: center;
      gap: 4px;
      color: var(--lw-red);
      font-size: 13px;
      font-weight: 500;
      white-space: nowrap;
    }

    lw-icon {
      width: 16px;
      height: 16px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Stops {
  readonly count = input.required<number>();
}
