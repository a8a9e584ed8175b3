/** Slows down whoever tries passwords: by the address they come from, and by the account they try. */
import { createHash } from 'node:crypto';
import type { Request, RequestHandler, Response } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { ProblemError } from './problem';

export interface SignInLimits {
  readonly windowMs: number;
  readonly perAddress: number;
  readonly perAccount: number;
}

export const SIGN_IN_LIMITS: SignInLimits = { windowMs: 15 * 60 * 1000, perAddress: 60, perAccount: 10 };

const addressKey = (request: Request): string => ipKeyGenerator(request.ip ?? 'unknown');

function accountKey(request: Request): string {
  const { email } = request.body as { email: string };
  return createHash('sha256').update(email.toLowerCase()).digest('base64url');
}

export function signInLimits(limits: SignInLimits): RequestHandler[] {
  const limiter = (limit: number, keyGenerator: (request: Request) => string): RequestHandler =>
    rateLimit({
      windowMs: limits.windowMs,
      limit,
      keyGenerator,
      // Only failures count: nobody is kept out by signing in often.
      skipSuccessfulRequests: true,
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      handler: (_request: Request, response: Response, next) => {
        const seconds = Number(response.getHeader('Retry-After') ?? limits.windowMs / 1000);
        const minutes = Math.max(1, Math.ceil(seconds / 60));
        next(
          new ProblemError('tooManyAttempts', {
            detail: `Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`} and try again.`,
          }),
        );
      },
    });
  return [limiter(limits.perAddress, addressKey), limiter(limits.perAccount, accountKey)];
}
