import type { Revision } from '@shared/contracts/revisions';
import type { FieldError } from '@shared/result';

/** Where the work on the screen stands against the server. Only `saved` may say so. */
export type SaveState =
  | { readonly is: 'saved'; readonly at: Date | null }
  | { readonly is: 'waiting' }
  | { readonly is: 'saving' }
  /** The engine refuses it; it is not sent until the fields are mended. */
  | { readonly is: 'held'; readonly fields: number }
  | { readonly is: 'trying'; readonly why: string; readonly seconds: number }
  | { readonly is: 'refused'; readonly why: string; readonly errors: readonly FieldError[] }
  | { readonly is: 'signed-out' }
  | { readonly is: 'stale'; readonly theirs: Revision };

const clock = (at: Date): string =>
  [at.getHours(), at.getMinutes(), at.getSeconds()].map((part) => String(part).padStart(2, '0')).join(':');

/** @param untaken a typed chain is not taken: what is saved is not all that was typed */
export function saveWords(state: SaveState, untaken = false): string {
  switch (state.is) {
    case 'saved': {
      const saved = state.at === null ? 'saved' : `saved ${clock(state.at)}`;
      return untaken ? `${saved}, but not the typed chain` : saved;
    }
    case 'waiting':
    case 'saving':
      return 'saving';
    case 'held':
      return `can't be saved: ${state.fields === 1 ? '1 field' : `${state.fields} fields`} to mend`;
    case 'trying':
      return `not saved: ${state.why} Trying again after ${state.seconds} s.`;
    case 'refused':
      return `not saved: ${state.why}`;
    case 'signed-out':
      return 'not saved: you are signed out';
    case 'stale':
      return `not saved: ${state.theirs.changedBy} saved in between`;
  }
}
