/** The app itself: built files, and its first page for every address that a person may have typed or kept. */
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { type Request, type RequestHandler, type Response } from 'express';
import { ProblemError } from '../middleware/problem';
import { styleNonce } from '../middleware/security-headers';

/** The build puts a hash of the content in these names, so they never change. */
const HASHED = /-[A-Z0-9]{8}\.(?:js|css|woff2)$/;
const YEAR = 365 * 24 * 60 * 60;

/** The app reads the nonce for its styles from its root element. */
const ROOT_ELEMENT = /(<body[^>]*>\s*(?:<noscript>.*?<\/noscript>\s*)?<[a-z]+(?:-[a-z]+)+)(?=[\s>])/s;

const isRead = (request: Request): boolean => request.method === 'GET' || request.method === 'HEAD';

const isNavigation = (request: Request): boolean => {
  const lastStep = request.path.slice(request.path.lastIndexOf('/') + 1);
  return (
    isRead(request) &&
    !request.path.startsWith('/api/') &&
    // A missing chunk or picture is missing; a page in its place would be read as one.
    !/\.[a-z0-9]{1,8}$/i.test(lastStep) &&
    request.accepts(['json', 'html']) === 'html'
  );
};

export function appFiles(folder: string): RequestHandler[] {
  const first = join(folder, 'index.html');
  if (!existsSync(first)) return [];
  const page = readFileSync(first, 'utf8');

  const sendPage = (response: Response): void => {
    response.setHeader('Cache-Control', 'no-cache');
    response.type('html').send(page.replace(ROOT_ELEMENT, `$1 ngCspNonce="${styleNonce(response)}"`));
  };

  return [
    (request, response, next) => {
      if (request.path !== '/index.html') next();
      else if (isRead(request)) sendPage(response);
      else {
        response.setHeader('Allow', 'GET, HEAD');
        throw new ProblemError('methodNotAllowed');
      }
    },
    express.static(folder, {
      index: false,
      redirect: false,
      setHeaders: (response, path) => {
        const keep = HASHED.test(path) ? `public, max-age=${YEAR}, immutable` : 'no-cache';
        response.setHeader('Cache-Control', keep);
      },
    }),
    (request, response, next) => {
      if (isNavigation(request)) sendPage(response);
      else next();
    },
  ];
}
