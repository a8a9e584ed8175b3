/** From what a service answers to what the caller gets. */
import type { Part } from '../../shared/contracts/parts';
import type { Revision } from '../../shared/contracts/revisions';
import { ProblemError } from '../middleware/problem';
import type { Outcome } from '../services/outcome';

const staleWords = (current: Revision | Part): string =>
  'changedBy' in current
    ? `${current.changedBy} saved version ${current.version} at ${current.changedAt}.`
    : 'The number or the title was changed in between.';

/** The value, or the refusal as a problem. */
export function valueOf<T>(outcome: Outcome<T>): T {
  if (outcome.ok) return outcome.value;
  switch (outcome.reason) {
    case 'not-found':
      throw new ProblemError('notFound');
    case 'refused':
      throw new ProblemError('invalid', { errors: outcome.errors });
    case 'taken':
      throw new ProblemError('taken', { errors: outcome.errors });
    case 'stale':
      throw new ProblemError('stale', {
        detail: staleWords(outcome.current),
        current: outcome.current,
      });
  }
}
