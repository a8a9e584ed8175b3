/** Reads a JSON body, after it is known who sends it. */
import express, { type RequestHandler } from 'express';
import { ProblemError } from './problem';

export const MAX_BODY = 1024 * 1024;

export function jsonBody(limit = MAX_BODY): RequestHandler {
  // strict: false lets `null` and bare figures through to the schemas, which word what they expected.
  const parse = express.json({ limit, strict: false });

  return (request, response, next) => {
    const hasBody = request.headers['transfer-encoding'] !== undefined || Number(request.headers['content-length']) > 0;
    if (!hasBody) throw new ProblemError('badRequest', { detail: 'The body is missing. Send JSON.' });
    if (!request.is('application/json')) {
      throw new ProblemError('unsupported', { detail: 'Send the body as application/json.' });
    }
    parse(request, response, (error?: unknown) => {
      // An empty chunked body is left unread by the parser.
      if (error === undefined && request.body === undefined) {
        next(new ProblemError('badRequest', { detail: 'The body is missing. Send JSON.' }));
      } else next(error);
    });
  };
}
