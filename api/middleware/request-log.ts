/** One line a request, with an id that the caller sees too, and nothing that would let a reader of the log act as somebody. */
import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import pino, { type DestinationStream, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import type { Config } from '../config';

export const makeLog = (config: Pick<Config, 'logLevel'>, destination?: DestinationStream): Logger => {
  const options = {
    level: config.logLevel,
    redact: {
      paths: [
        'req.headers.cookie',
        'req.headers.authorization',
        'req.headers["x-csrf-token"]',
        'res.headers["set-cookie"]',
      ],
      censor: '…',
    },
  };
  return destination ? pino(options, destination) : pino(options);
};

export const requestLog = (logger: Logger): RequestHandler =>
  pinoHttp({
    logger,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    customLogLevel: (_request, response, error) => (error || response.statusCode >= 500 ? 'error' : 'info'),
  }) as RequestHandler;
