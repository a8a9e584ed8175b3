import { Injectable, signal } from '@angular/core';

/** Whether the last request got an answer, any answer, from the server. */
@Injectable({ providedIn: 'root' })
export class Reachability {
  private readonly state = signal(true);
  readonly reachable = this.state.asReadonly();

  answered(): void {
    this.state.set(true);
  }

  lost(): void {
    this.state.set(false);
  }
}
