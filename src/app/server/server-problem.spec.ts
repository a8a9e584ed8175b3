import { HttpErrorResponse, HttpHeaders } from '@angular/common/http';
import { PROBLEM } from '@shared/contracts/problem-types';
import { readProblem } from './read-problem';
import { ServerProblem } from './server-problem';

const answer = (status: number, error: unknown, headers?: Record<string, string>): ServerProblem =>
  ServerProblem.of(new HttpErrorResponse({ status, error, headers: new HttpHeaders(headers) }));

describe('ServerProblem', () => {
  it('reads problem details with their fields', () => {
    const problem = answer(422, {
      type: PROBLEM.invalid,
      title: 'Refused',
      status: 422,
      detail: 'The document was refused.',
      errors: [{ path: 'chain/3/radius', message: 'Not a length.' }],
    });
    expect(problem.kind).toBe('refused');
    expect(problem.is('invalid')).toBeTrue();
    expect(problem.is('stale')).toBeFalse();
    expect(problem.message).toBe('The document was refused.');
    expect(problem.errors).toEqual([{ path: 'chain/3/radius', message: 'Not a length.' }]);
  });

  it('tells a lost server from a refusal, on both sides', () => {
    expect(answer(0, new ProgressEvent('error')).kind).toBe('unreachable');
    expect(answer(501, 'no').kind).toBe('refused');
    expect(answer(502, '<html>Bad gateway</html>').kind).toBe('unreachable');
    expect(answer(504, null).kind).toBe('unreachable');
    expect(answer(505, null).kind).toBe('refused');
  });

  it('believes a 503 that comes from our own server', () => {
    const problem = answer(503, { type: PROBLEM.unavailable, title: 'Busy', status: 503 });
    expect(problem.kind).toBe('refused');
    expect(problem.message).toBe('Busy');
  });

  it('reads how long to wait', () => {
    expect(answer(429, null, { 'Retry-After': '40' }).retryAfter).toBe(40);
    expect(answer(429, null, { 'Retry-After': 'Wed, 21 Oct 2026 07:28:00 GMT' }).retryAfter).toBeNull();
    expect(answer(429, null).retryAfter).toBeNull();
  });

  it('has words even for an answer without any', () => {
    expect(answer(500, 'oops').message).toContain('500');
  });
});

describe('readProblem', () => {
  it('takes no other shape', () => {
    for (const body of [null, 'text', [], {}, { type: 1, title: 'x', status: 400 }, { type: 'x', title: 'x' }]) {
      expect(readProblem(body)).toBeNull();
    }
  });

  it('leaves out errors that have no path or message', () => {
    const problem = readProblem({
      type: 'a',
      title: 'b',
      status: 400,
      errors: [null, { path: 'a' }, { path: 'p', message: 'm' }],
    });
    expect(problem?.errors).toEqual([{ path: 'p', message: 'm' }]);
  });

  it('keeps the revision that a refused save answers with', () => {
    expect(readProblem({ type: 'a', title: 'b', status: 409, current: { version: 4 } })?.current).toEqual({
      version: 4,
    });
  });
});
