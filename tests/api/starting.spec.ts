/** The server as a process: what it says, when it listens, how it ends. */
import { chmodSync, existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Programs } from '../support/program';

describe('the server', () => {
  const programs = new Programs();
  let folder: string;
  let dataDir: string;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'leafwright-server-'));
    dataDir = join(folder, 'data');
  });

  afterEach(async () => {
    await programs.stop();
    rmSync(folder, { recursive: true, force: true });
  });

  const start = (env: Record<string, string>) =>
    programs.start('api/server.ts', [], { DATA_DIR: dataDir, PORT: '0', ...env });

  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    it(`opens, answers, and ends in order on ${signal}`, async () => {
      const server = start({});
      const address = await server.opened;
      expect((await fetch(`${address}/healthz`)).status).toBe(200);
      expect(server.said.text).toContain('designer@harrowcreek.example');
      const long = await fetch(`${address}/`, { headers: { 'x-long': 'x'.repeat(20_000) } });
      expect([long.status, long.headers.get('content-type')]).toEqual([431, 'application/problem+json']);
      server.child.kill(signal);
      server.child.kill(signal);
      expect(await server.ended).toBe(0);
    }, 30_000);
  }

  it('says in one plain line why it does not start, and has made nothing by then', async () => {
    const first = start({});
    const address = await first.opened;
    const port = new URL(address).port;
    const elsewhere = join(folder, 'elsewhere');
    const second = start({ PORT: port, DATA_DIR: elsewhere });
    expect(await second.ended).toBe(1);
    expect(second.said.text).toBe(
      `Leafwright did not start. Port ${port} is in use. Stop what uses it, or choose another with PORT.\n`,
    );
    expect(existsSync(elsewhere)).toBeFalse();
    const other = start({ SHOP: 'own' });
    expect(await other.ended).toBe(1);
    expect(other.said.text).toMatch(/^Leafwright did not start\. .* holds a demo shop; .*\n$/);
  }, 30_000);

  it('keeps what it keeps from other accounts of the machine', async () => {
    const server = start({});
    await server.opened;
    expect(statSync(dataDir).mode & 0o777).toBe(0o700);
    const files = readdirSync(dataDir);
    expect(files).toContain('leafwright.sqlite');
    for (const file of files) {
      expect(statSync(join(dataDir, file)).mode & 0o777)
        .withContext(file)
        .toBe(0o600);
    }
  }, 30_000);

  const DATABASE = 'leafwright.sqlite';
  for (const [words, prepare, says] of [
    ['a file in place of the folder', () => writeFileSync(dataDir, ''), / is not a folder\./],
    ['a folder below a file', () => writeFileSync((dataDir = join(folder, 'file')), ''), / is not a folder\./],
    [
      'a folder in place of the database',
      () => mkdirSync(join(dataDir, DATABASE), { recursive: true }),
      /can’t be opened/,
    ],
    [
      'a database that is none',
      () => {
        mkdirSync(dataDir);
        writeFileSync(join(dataDir, DATABASE), 'good morning '.repeat(500));
      },
      /is not a Leafwright database/,
    ],
  ] as const) {
    it(`does not start with ${words}, and says so`, async () => {
      prepare();
      const server = start({ DATA_DIR: words.includes('below') ? join(dataDir, 'data') : dataDir });
      expect(await server.ended).toBe(1);
      expect(server.said.text).toMatch(/^Leafwright did not start\. [^\n]*\n$/);
      expect(server.said.text).toMatch(says);
    }, 30_000);
  }

  for (const [words, prepare, says] of [
    [
      'a folder that it may not write',
      () => {
        mkdirSync(dataDir);
        chmodSync(dataDir, 0o555);
      },
      /has no right to use /,
    ],
    [
      'a database that it may only read',
      () => {
        mkdirSync(dataDir);
        writeFileSync(join(dataDir, DATABASE), '');
        chmodSync(join(dataDir, DATABASE), 0o444);
        chmodSync(dataDir, 0o777);
      },
      /has no right to use /,
    ],
  ] as const) {
    it(`does not start with ${words}, and says so`, async () => {
      chmodSync(folder, 0o755);
      prepare();
      const server = programs.start('api/server.ts', [], { DATA_DIR: dataDir, PORT: '0' }, { asNobody: true });
      expect(await server.ended).toBe(1);
      expect(server.said.text).toMatch(/^Leafwright did not start\. [^\n]*\n$/);
      expect(server.said.text).toMatch(says);
    }, 30_000);
  }
});
