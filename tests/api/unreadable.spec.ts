/** What Node itself can't read as a request gets an answer in the API's one shape too. */
import { once } from 'node:events';
import { createServer, type Server } from 'node:http';
import { type AddressInfo, connect } from 'node:net';
import { answerUnreadable } from '../../api/middleware/unreadable-request';
import type { Problem } from '../../shared/contracts/problem';

describe('a request that can’t be read', () => {
  let server: Server;

  beforeAll(async () => {
    server = createServer((_request, response) => response.end('read'));
    server.on('clientError', answerUnreadable);
    server.listen(0, '127.0.0.1');
    await once(server, 'listening');
  });

  afterAll(async () => {
    server.close();
    await once(server, 'close');
  });

  async function send(text: string): Promise<{ head: string; body: string }> {
    const socket = connect((server.address() as AddressInfo).port, '127.0.0.1');
    let answer = '';
    socket.on('data', (chunk: Buffer) => (answer += chunk.toString()));
    socket.write(text);
    await once(socket, 'close');
    const [head = '', body = ''] = answer.split('\r\n\r\n');
    return { head, body };
  }

  const headerOf = (length: number): string =>
    `GET / HTTP/1.1\r\nHost: x\r\nConnection: close\r\nX-Long: ${'x'.repeat(length)}\r\n\r\n`;

  for (const [words, text, status] of [
    ['oversized headers', headerOf(20_000), 431],
    ['no HTTP at all', 'good morning\r\n\r\n', 400],
  ] as const) {
    it(`for ${words} is answered with a problem`, async () => {
      const { head, body } = await send(text);
      expect(head).toMatch(new RegExp(`^HTTP/1.1 ${status} `));
      expect(head).toContain('Content-Type: application/problem+json');
      expect(head).toContain(`Content-Length: ${Buffer.byteLength(body)}`);
      const problem = JSON.parse(body) as Problem;
      expect(problem.status).toBe(status);
      expect(problem.title).toBeTruthy();
    });
  }

  it('does not stand in the way of headers that fit', async () => {
    expect((await send(headerOf(10_000))).head).toMatch(/^HTTP\/1.1 200 /);
  });
});
