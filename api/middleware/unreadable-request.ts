/** Requests that Node itself can't read never reach the app; they get a problem document all the same. */
import { STATUS_CODES } from 'node:http';
import type { Duplex } from 'node:stream';
import { problem, type ProblemKind } from './problem';

const KINDS: Readonly<Record<string, ProblemKind>> = {
  HPE_HEADER_OVERFLOW: 'headersTooLarge',
  ERR_HTTP_REQUEST_TIMEOUT: 'tooSlow',
};

/** For a server's `clientError`. */
export function answerUnreadable(error: NodeJS.ErrnoException, socket: Duplex): void {
  if (error.code === 'ECONNRESET' || !socket.writable) {
    socket.destroy();
    return;
  }
  const answer = problem(KINDS[error.code ?? ''] ?? 'badRequest');
  const body = JSON.stringify(answer);
  const head = [
    `HTTP/1.1 ${answer.status} ${STATUS_CODES[answer.status]}`,
    'Content-Type: application/problem+json',
    `Content-Length: ${Buffer.byteLength(body)}`,
    'Cache-Control: no-store',
    'Connection: close',
  ];
  socket.end(`${head.join('\r\n')}\r\n\r\n${body}`);
}
