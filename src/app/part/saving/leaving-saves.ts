import { Injectable } from '@angular/core';

/** Saves that are still on their way after their page was left. Whoever opens the part again waits for them. */
@Injectable({ providedIn: 'root' })
export class LeavingSaves {
  private readonly underway = new Map<string, Set<Promise<void>>>();

  /** @returns to be called when nothing more is on its way */
  begin(part: string): () => void {
    const saves = this.underway.get(part) ?? new Set();
    this.underway.set(part, saves);
    let done = (): void => undefined;
    const save = new Promise<void>((resolve) => (done = resolve));
    saves.add(save);
    return () => {
      saves.delete(save);
      if (saves.size === 0) this.underway.delete(part);
      done();
    };
  }

  /** Null when nothing is on its way. */
  settled(part: string): Promise<unknown> | null {
    const saves = this.underway.get(part);
    return saves ? Promise.all(saves) : null;
  }
}
