import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Reachability } from '../server/reachability';
import { Icon } from '../ui/icon';
import { OutageWatch } from './outage-watch';

/** Says quietly that the server does not answer, while the watch keeps asking. The page under it stays. */
@Component({
  selector: 'lw-outage-bar',
  imports: [MatButtonModule, Icon],
  template: `
    <div role="status">
      @if (!reachability.reachable()) {
        <div class="bar">
          <lw-icon name="lost" />
          <span>The server can't be reached. Nothing on this page is lost; trying again by itself.</span>
          <button matButton type="button" [disabled]="watch.asking()" disabledInteractive (click)="watch.ask()">
            {{ watch.asking() ? 'Trying …' : 'Try now' }}
          </button>
        </div>
      }
    </div>
  `,
  styles: `
    .bar {
      display: flex;
      align-items: center;
      gap: 10px;
      min-height: 44px;
      padding: 0 clamp(12px, 2vw, 24px);
      border-bottom: 1px solid var(--lw-line);
      background: var(--lw-amber-wash);
    }

    lw-icon {
      color: var(--lw-amber);
    }

    span {
      flex: 1;
      padding: 6px 0;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class OutageBar {
  protected readonly reachability = inject(Reachability);
  protected readonly watch = inject(OutageWatch);
}
