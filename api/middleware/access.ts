/** Who may use a route. */
import type { Request, RequestHandler } from 'express';
import type { Person, Role } from '../../shared/contracts/session';
import { ProblemError } from './problem';

export type Access = 'anybody' | 'signed-in' | readonly Role[];

/** The person behind a request of a route that is not open to anybody. */
export function personOf(request: Request): Person {
  if (!request.user) throw new ProblemError('signedOut');
  return request.user;
}

const list = (roles: readonly Role[]): string => roles.map((role) => `${role}s`).join(' and ');

export function requireAccess(access: Access): RequestHandler {
  return (request, _response, next) => {
    if (access !== 'anybody') {
      const person = personOf(request);
      if (access !== 'signed-in' && !access.some((role) => person.roles.includes(role))) {
        throw new ProblemError('forbidden', { detail: `This is for ${list(access)}.` });
      }
    }
    next();
  };
}
