/** From what a service answers to what the caller gets. */
import { ProblemError } from '../middleware/problem';
import type { Outcome } from '../services/outcome';

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
        detail: `${outcome.current.changedBy} saved version ${outcome.current.version} at ${outcome.current.changedAt}.`,
        current: outcome.current,
      });
  }
}
