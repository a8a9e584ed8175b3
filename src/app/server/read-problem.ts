import type { Problem } from '@shared/contracts/problem';
import type { FieldError } from '@shared/result';

/**
 * Problem details from the body of a failed answer, or null when the body is something else (a proxy's page, say).
 * Read by hand: the schema library is not needed before sign-in, and this is all of it that would be.
 */
export function readProblem(body: unknown): Problem | null {
  if (!isRecord(body)) return null;
  const { type, title, status, detail, errors, current } = body as Partial<Record<keyof Problem, unknown>>;
  if (typeof type !== 'string' || typeof title !== 'string' || typeof status !== 'number') return null;
  return {
    type,
    title,
    status,
    ...(typeof detail === 'string' ? { detail } : {}),
    ...(Array.isArray(errors) ? { errors: errors.filter(isFieldError) } : {}),
    ...(current === undefined ? {} : { current }),
  };
}

function isFieldError(value: unknown): value is FieldError {
  return isRecord(value) && typeof value['path'] === 'string' && typeof value['message'] === 'string';
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
