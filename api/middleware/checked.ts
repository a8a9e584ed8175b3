/** Outside data through a schema: the typed value, or the fields that are wrong. */
import type { z } from 'zod';
import type { FieldError } from '../../shared/result';
import { ProblemError } from './problem';

/** An unknown field is reported at its own path, as the engine does, not at the object it sits in. */
function fieldErrors(issue: z.core.$ZodIssue): FieldError[] {
  const path = issue.path.map(String);
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({ path: [...path, key].join('/'), message: `There is no field “${key}” here.` }));
  }
  return [{ path: path.join('/'), message: issue.message }];
}

export function checked<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const outcome = schema.safeParse(value);
  if (outcome.success) return outcome.data;
  throw new ProblemError('invalid', { errors: outcome.error.issues.flatMap(fieldErrors) });
}
