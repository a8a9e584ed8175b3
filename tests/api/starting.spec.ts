/** The server as a process: what it says, when it listens, how it ends. */
import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PACKAGE_ROOT } from '../../api/package-root';

describe('the server', () => {
  let dataDir: string;
  const running: ChildProcess[] = [];

  beforeEach(() => {
    dataDir = mkdtempSync(join(tmpdir(), 'leafwright-server-'));
  });

  afterEach(async () => {
    for (const child of running.splice(0)) {
      if (child.exitCode === null && child.kill('SIGKILL')) await once(child, 'exit');
    }
    rmSync(dataDir, { recursive: true, force: true });
  });

  function start(env: Record<string, string>) {
    const child = spawn(process.execPath, ['--import', 'tsx', 'api/server.ts'], {
      cwd: PACKAGE_ROOT,
      env: { ...process.env, DATA_DIR: dataDir, PORT: '0', ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    running.push(child);
    const said = { text: '' };
    const opened = new Promise<string>((resolve) => {
      child.stdout.on('data', (chunk: Buffer) => {
        said.text += chunk.toString();
        const address = /http:\/\/localhost:\d+/.exec(said.text)?.[0];
        if (address !== undefined && said.text.includes('Ctrl-C')) resolve(address);
      });
    });
    child.stderr.on('data', (chunk: Buffer) => (said.text += chunk.toString()));
    return { child, said, opened, ended: once(child, 'close').then(([code]) => code as number | null) };
  }

  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    it(`opens, answers, and ends in order on ${signal}`, async () => {
      const server = start({});
      const address = await server.opened;
      expect((await fetch(`${address}/healthz`)).status).toBe(200);
      expect(server.said.text).toContain('designer@harrowcreek.example');
      server.child.kill(signal);
      server.child.kill(signal);
      expect(await server.ended).toBe(0);
    }, 30_000);
  }

  it('says in one plain line why it does not start', async () => {
    const first = start({});
    const address = await first.opened;
    const port = new URL(address).port;
    const second = start({ PORT: port });
    expect(await second.ended).toBe(1);
    expect(second.said.text).toBe(
      `Leafwright did not start. Port ${port} is in use. Stop what uses it, or choose another with PORT.\n`,
    );
    const other = start({ SHOP: 'own' });
    expect(await other.ended).toBe(1);
    expect(other.said.text).toMatch(/^Leafwright did not start\. .* holds a demo shop; .*\n$/);
  }, 30_000);
});
