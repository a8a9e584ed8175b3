/**
 * Keeps other sites from acting in somebody's name. A changing request brings back a token that this server signed for the
 * caller's own session (before sign-in: for a visitor cookie), and a browser that says where a request comes from is believed.
 */
import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto';
import type { CookieOptions, Request, RequestHandler, Response } from 'express';
import { ProblemError } from './problem';

export const CSRF_HEADER = 'X-CSRF-Token';
const VISITOR_COOKIE = 'leafwright.visitor';
const VISITOR_ID = /^[A-Za-z0-9_-]{32}$/;

function visitorOf(request: Request): string | null {
  for (const pair of (request.headers.cookie ?? '').split(';')) {
    const [name, value] = pair.trim().split('=');
    if (name === VISITOR_COOKIE && value !== undefined && VISITOR_ID.test(value)) return value;
  }
  return null;
}

/** What a token is bound to: the signed-in session, else the visitor. */
const bindingOf = (request: Request): string | null =>
  request.user ? `session ${request.sessionID}` : (visitorOf(request) ?? null);

function comesFromElsewhere(request: Request): boolean {
  const site = request.get('Sec-Fetch-Site');
  if (site !== undefined) return site !== 'same-origin' && site !== 'none';
  const origin = request.get('Origin');
  if (origin === undefined) return false;
  return !URL.canParse(origin) || new URL(origin).host !== request.host;
}

export function csrf(secret: string) {
  const sign = (nonce: string, binding: string): Buffer =>
    createHmac('sha256', secret).update(`csrf ${nonce} ${binding}`).digest();

  /** A fresh token for whoever asks, with a visitor cookie where there is no session to bind it to. */
  const issue = (request: Request, response: Response): string => {
    let binding = bindingOf(request);
    if (binding === null) {
      binding = randomBytes(24).toString('base64url');
      const options: CookieOptions = { httpOnly: true, sameSite: 'lax', secure: request.secure, path: '/' };
      response.cookie(VISITOR_COOKIE, binding, options);
    }
    const nonce = randomBytes(18).toString('base64url');
    return `${nonce}.${sign(nonce, binding).toString('base64url')}`;
  };

  const holds = (request: Request): boolean => {
    const binding = bindingOf(request);
    const [nonce = '', signature = ''] = (request.get(CSRF_HEADER) ?? '').split('.');
    if (binding === null || nonce === '') return false;
    const expected = sign(nonce, binding);
    const given = Buffer.from(signature, 'base64url');
    return given.length === expected.length && timingSafeEqual(given, expected);
  };

  const check: RequestHandler = (request, _response, next) => {
    if (comesFromElsewhere(request)) throw new ProblemError('csrf', { detail: 'It came from another site.' });
    if (!holds(request)) throw new ProblemError('csrf', { detail: 'Load the page again and repeat it.' });
    next();
  };

  return { issue, check };
}

export type Csrf = ReturnType<typeof csrf>;
