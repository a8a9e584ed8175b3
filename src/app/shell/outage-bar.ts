import { ChangeDetectionStrategy, Component, effect, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { exhaustMap, repeat, timer } from 'rxjs';
import { Reachability } from '../server/reachability';
import { SessionStore } from '../session/session-store';
import { Icon } from '../ui/icon';

const FIRST_WAIT = 3_000;
const LONGEST_WAIT = 30_000;

/** Says quietly that the server does not answer, and keeps asking until it does. Nothing on the page is taken away. */
@Component({
  selector: 'lw-outage-bar',
  imports: [MatButtonModule, Icon],
  template: `
    <div role="status">
      @if (!reachability.reachable()) {
        <div class="bar">
          <lw-icon name="lost" />
          <span>The server can't be reached. What is on the screen stays; trying again by itself.</span>
          <button matButton type="button" [disabled]="asking()" disabledInteractive (click)="ask()">
            {{ asking() ? 'Trying …' : 'Try now' }}
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
  private readonly session = inject(SessionStore);
  protected readonly asking = signal(false);

  constructor() {
    effect((onCleanup) => {
      if (this.reachability.reachable()) return;
      const asking = timer(FIRST_WAIT)
        .pipe(
          exhaustMap(() => this.ask()),
          repeat({ delay: (times) => timer(Math.min(FIRST_WAIT * 2 ** times, LONGEST_WAIT) - FIRST_WAIT) }),
        )
        .subscribe();
      onCleanup(() => asking.unsubscribe());
    });
  }

  /** Only asks; who is signed in is left as it stands on the screen. */
  protected async ask(): Promise<void> {
    if (this.asking()) return;
    this.asking.set(true);
    try {
      await this.session.renewToken();
    } catch {
      // Still no answer: the bar stays.
    } finally {
      this.asking.set(false);
    }
  }
}
