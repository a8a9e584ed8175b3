import { LiveAnnouncer } from '@angular/cdk/a11y';
import { effect, inject } from '@angular/core';

const PAUSE_MS = 1000;

/**
 * Reads out what a box has to say once the typing pauses: at every key it would only be noise about half a word. To be
 * called where something is injected.
 *
 * @param words what is to be said now, null when there is nothing @param typed what stands in the box
 */
export function announceAfterPause(words: () => string | null, typed: () => unknown): void {
  const announcer = inject(LiveAnnouncer);
  effect((onCleanup) => {
    typed();
    const said = words();
    if (said === null) return;
    const timer = setTimeout(() => void announcer.announce(said, 'polite'), PAUSE_MS);
    onCleanup(() => clearTimeout(timer));
  });
}
