/** The one place where anything that went wrong becomes an answer. */
import type { ErrorRequestHandler, RequestHandler } from 'express';
import type { Problem } from '../../shared/contracts/problem';
import { Overdue } from '../models/one-at-a-time';
import { sqliteCode } from '../models/sqlite-code';
import { MAX_BODY } from './json-body';
import { problem, ProblemError } from './problem';

/** What SQLite says when the disk or another process, not the request, is in the way. */
const UNAVAILABLE = /^SQLITE_(BUSY|LOCKED|FULL|READONLY|IOERR|CANTOPEN|CORRUPT|NOTADB|PROTOCOL)/;

const sizeWords = (bytes: number): string =>
  bytes >= 1024 * 1024 ? `${bytes / 1024 / 1024} MB` : `${bytes / 1024} kB`;

/** Errors of the framework itself (a body that can't be read, a path that can't be decoded) carry a status and mean the request. */
function fromStatus(error: { status?: unknown; type?: unknown; limit?: unknown }): Problem | null {
  switch (error.status) {
    case 413:
      return problem('tooLarge', {
        detail: `A request may have ${sizeWords(typeof error.limit === 'number' ? error.limit : MAX_BODY)} at most.`,
      });
    case 415:
      return problem('unsupported', { detail: 'Send JSON in UTF-8, plain or compressed with gzip, deflate or br.' });
    case 404:
      return problem('notFound');
    default:
      break;
  }
  if (typeof error.status !== 'number' || error.status < 400 || error.status > 499) return null;
  return problem('badRequest', {
    detail: error.type === 'entity.parse.failed' ? 'The body is not valid JSON.' : 'The address or the body is broken.',
  });
}

export function problemOf(error: unknown): Problem {
  if (error instanceof ProblemError) return error.problem;
  if (error instanceof Overdue || UNAVAILABLE.test(sqliteCode(error))) return problem('unavailable');
  return fromStatus(Object(error) as { status?: unknown }) ?? problem('internal');
}

export const errorHandler: ErrorRequestHandler = (error, request, response, next) => {
  const answer = problemOf(error);
  if (answer.status >= 500) request.log.error({ err: error as unknown }, answer.title);
  if (response.headersSent) {
    // Half an answer is out already: break the connection, so that nobody takes it for a whole one.
    next(error);
    return;
  }
  const retryAfter = error instanceof ProblemError ? error.retryAfter : null;
  if (retryAfter !== null) response.setHeader('Retry-After', String(retryAfter));
  else if (answer.status === 503) response.setHeader('Retry-After', '5');
  response.status(answer.status).type('application/problem+json').send(JSON.stringify(answer));
};

export const notFound: RequestHandler = (_request, _response, next) => {
  next(new ProblemError('notFound'));
};
