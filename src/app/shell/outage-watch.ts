import { effect, inject, Injectable, signal } from '@angular/core';
import { exhaustMap, repeat, timer } from 'rxjs';
import { Reachability } from '../server/reachability';
import { SessionStore } from '../session/session-store';

const FIRST_WAIT = 3_000;
const LONGEST_WAIT = 30_000;

/** While the server does not answer, asks it again and again with growing pauses. */
@Injectable({ providedIn: 'root' })
export class OutageWatch {
  private readonly reachability = inject(Reachability);
  private readonly session = inject(SessionStore);
  private readonly busy = signal(false);
  readonly asking = this.busy.asReadonly();

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
  async ask(): Promise<void> {
    if (this.busy()) return;
    this.busy.set(true);
    try {
      await this.session.renewToken();
    } catch {
      // Still no answer; the next question comes by itself.
    } finally {
      this.busy.set(false);
    }
  }
}
