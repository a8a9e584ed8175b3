/** What a service answers: the value, or why not. A route turns a refusal into a problem; nothing is thrown for what is expected. */
import type { Part } from '../../shared/contracts/parts';
import type { Revision } from '../../shared/contracts/revisions';
import type { FieldError } from '../../shared/result';

export type Refusal =
  | { readonly ok: false; readonly reason: 'not-found' }
  | { readonly ok: false; readonly reason: 'refused'; readonly errors: readonly FieldError[] }
  | { readonly ok: false; readonly reason: 'taken'; readonly errors: readonly FieldError[] }
  | { readonly ok: false; readonly reason: 'stale'; readonly current: Revision | Part };

export type Outcome<T> = { readonly ok: true; readonly value: T } | Refusal;

export const done = <T>(value: T): Outcome<T> => ({ ok: true, value });
export const NOT_FOUND: Refusal = { ok: false, reason: 'not-found' };
