import type { HttpErrorResponse } from '@angular/common/http';
import type { Problem } from '@shared/contracts/problem';
import { PROBLEM } from '@shared/contracts/problem-types';
import type { FieldError } from '@shared/result';
import { readProblem } from './read-problem';

/** `refused`: the server answered and said no. `unreachable`: no answer, so nothing is known about the request. */
export type ServerProblemKind = 'refused' | 'unreachable';

/** What every failed request throws. The one place that reads the error shape of the API. */
export class ServerProblem extends Error {
  override readonly name = 'ServerProblem';

  private constructor(
    readonly kind: ServerProblemKind,
    readonly status: number,
    readonly problem: Problem | null,
    message: string,
    /** Seconds the server asks us to wait, when it says so. */
    readonly retryAfter: number | null,
  ) {
    super(message);
  }

  /** `type` of the problem details, e.g. `PROBLEM.stale`; null when the answer had none. */
  get type(): string | null {
    return this.problem?.type ?? null;
  }

  get errors(): readonly FieldError[] {
    return this.problem?.errors ?? [];
  }

  /** On a refused save: the revision as it stands on the server. */
  get current(): unknown {
    return this.problem?.current;
  }

  is(type: keyof typeof PROBLEM): boolean {
    return this.type === PROBLEM[type];
  }

  static of(response: HttpErrorResponse, body: unknown = response.error): ServerProblem {
    const wait = Number(response.headers.get('Retry-After') ?? Number.NaN);
    const retryAfter = Number.isFinite(wait) ? wait : null;
    const problem = readProblem(body);
    // A proxy in front of a stopped server answers 502–504 in its own words: the shop's server was not reached.
    const gateway = problem === null && response.status >= 502 && response.status <= 504;
    if (response.status === 0 || gateway) {
      return new ServerProblem('unreachable', response.status, null, "The server can't be reached.", retryAfter);
    }
    const message = problem?.detail ?? problem?.title ?? `The server answered with an error (${response.status}).`;
    return new ServerProblem('refused', response.status, problem, message, retryAfter);
  }
}
