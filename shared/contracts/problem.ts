/** Problem details (RFC 9457): the one shape in which the API says that something went wrong. */
import * as z from 'zod';

/** Kept apart so that the app's first page needs no schema library. */
export { PROBLEM } from './problem-types';

export const fieldErrorSchema = z.object({ path: z.string(), message: z.string() });

export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string().optional(),
  errors: z.array(fieldErrorSchema).optional(),
  /** On a refused save: the revision (or part) as it now stands on the server. */
  current: z.unknown().optional(),
});

export type Problem = z.infer<typeof problemSchema>;
