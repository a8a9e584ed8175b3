/** A refusal on its way to the caller, in the one shape the API has for it. */
import { PROBLEM, type Problem } from '../../shared/contracts/problem';
import type { FieldError } from '../../shared/result';

export type ProblemKind = keyof typeof PROBLEM;

const KINDS: Record<ProblemKind, { status: number; title: string }> = {
  badRequest: { status: 400, title: 'The request could not be read.' },
  invalid: { status: 422, title: 'Some fields need another value.' },
  signedOut: { status: 401, title: 'Sign in first.' },
  wrongCredentials: { status: 401, title: 'E-mail address and password do not match.' },
  tooManyAttempts: { status: 429, title: 'Too many attempts to sign in.' },
  forbidden: { status: 403, title: 'Your role does not allow this.' },
  csrf: { status: 403, title: 'The request did not come from this page, or the page is out of date.' },
  notFound: { status: 404, title: 'There is nothing here.' },
  methodNotAllowed: { status: 405, title: 'This address does not take that request.' },
  taken: { status: 409, title: 'That is already in use.' },
  stale: { status: 409, title: 'Somebody saved a newer version.' },
  tooLarge: { status: 413, title: 'The request is too large.' },
  headersTooLarge: { status: 431, title: 'The headers of the request are too large.' },
  tooSlow: { status: 408, title: 'The request took too long to arrive.' },
  unsupported: { status: 415, title: 'The request is in a form that is not understood.' },
  unavailable: { status: 503, title: 'The shop’s data can’t be reached just now. Try again.' },
  internal: { status: 500, title: 'Something went wrong on the server.' },
};

export interface ProblemMore {
  readonly detail?: string;
  readonly errors?: readonly FieldError[];
  readonly current?: unknown;
}

/** More of them help nobody, and an answer must not grow with what was sent. */
const MOST_ERRORS = 50;

export function problem(kind: ProblemKind, more: ProblemMore = {}): Problem {
  const { status, title } = KINDS[kind];
  return {
    type: PROBLEM[kind],
    title,
    status,
    ...(more.detail === undefined ? {} : { detail: more.detail }),
    ...(more.errors === undefined ? {} : { errors: more.errors.slice(0, MOST_ERRORS) }),
    ...(more.current === undefined ? {} : { current: more.current }),
  };
}

/** Carries a problem from a middleware or a route to the error handler. */
export class ProblemError extends Error {
  readonly problem: Problem;
  /** Seconds after which it is worth another try. */
  readonly retryAfter: number | null;

  constructor(kind: ProblemKind, more: ProblemMore = {}, retryAfter: number | null = null) {
    super(KINDS[kind].title);
    this.problem = problem(kind, more);
    this.retryAfter = retryAfter;
  }
}
