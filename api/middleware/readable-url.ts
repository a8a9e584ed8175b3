/** Addresses that no caller of ours writes, refused before anything reads a part of them. */
import type { RequestHandler } from 'express';
import { ProblemError } from './problem';

export const readableUrl: RequestHandler = (request, _response, next) => {
  // NUL ends a text early in SQL and in file names.
  if (/%00|\0/.test(request.url)) throw new ProblemError('badRequest', { detail: 'The address is broken.' });
  next();
};
