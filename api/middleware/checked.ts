/** Outside data through a schema: the typed value, or the fields that are wrong. */
import type { z } from 'zod';
import type { FieldError } from '../../shared/result';
import { issueWords } from './issue-words';
import { ProblemError } from './problem';

const MOST_ERRORS = 50;
const LONGEST_NAME = 60;

/** A name that the caller made up, short enough to give back; never cut through the middle of a character. */
const cut = (name: PropertyKey): string =>
  String(name)
    .slice(0, LONGEST_NAME)
    .replace(/[\uD800-\uDBFF]$/, '');

/** An unknown field is reported at its own path, as the engine does, not at the object it sits in. */
function fieldErrors(issue: z.core.$ZodIssue): FieldError[] {
  const path = issue.path.map(cut);
  if (issue.code === 'unrecognized_keys') {
    return issue.keys
      .slice(0, MOST_ERRORS)
      .map((key) => ({ path: [...path, cut(key)].join('/'), message: `There is no field “${cut(key)}” here.` }));
  }
  return [{ path: path.join('/'), message: issue.message }];
}

export function checked<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const outcome = schema.safeParse(value, { error: issueWords });
  if (outcome.success) return outcome.data;
  throw new ProblemError('invalid', { errors: outcome.error.issues.slice(0, MOST_ERRORS).flatMap(fieldErrors) });
}
