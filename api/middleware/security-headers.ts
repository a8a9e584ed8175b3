/** Response headers that hold the browser to what the app needs: its own scripts, styles, fonts and pictures, nothing else. */
import { randomBytes } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import type { RequestHandler, Response } from 'express';
import helmet from 'helmet';

/** For the styles that Angular writes into the page; a new one for each response. */
export const styleNonce = (response: Response): string => String(response.locals['styleNonce']);

const giveNonce: RequestHandler = (_request, response, next) => {
  response.locals['styleNonce'] = randomBytes(16).toString('base64');
  next();
};

export const securityHeaders: RequestHandler[] = [
  giveNonce,
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'"],
        styleSrc: [
          "'self'",
          (_request: IncomingMessage, response: ServerResponse) => `'nonce-${styleNonce(response as Response)}'`,
        ],
        // Positions are set by script, element by element; a style written into the page's text is nobody of ours.
        styleSrcAttr: ["'none'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'"],
        manifestSrc: ["'self'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        objectSrc: ["'none'"],
        // No upgrade-insecure-requests: a shop network may be plain HTTP.
      },
    },
    // Only has a meaning over HTTPS, and there it belongs to whoever holds the certificate.
    strictTransportSecurity: false,
    referrerPolicy: { policy: 'same-origin' },
    xFrameOptions: { action: 'deny' },
  }),
];
