import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const ROOT = join(__dirname, '..', '..');

export interface Shop {
  readonly address: string;
  /** Ends the server and starts it again on the same data. */
  readonly restart: () => Promise<void>;
  readonly stop: () => Promise<void>;
  readonly close: () => Promise<void>;
}

/** The product as the README starts it, on a port and a data folder of its own. */
export async function openShop(): Promise<Shop> {
  const folder = mkdtempSync(join(tmpdir(), 'leafwright-journey-'));
  const port = await freePort();
  const address = `http://127.0.0.1:${port}`;
  const env = { ...process.env, PORT: String(port), DATA_DIR: folder, LOG_LEVEL: 'warn' };
  let child: ChildProcess | null = await start(env, address);
  const stop = async (): Promise<void> => {
    if (child !== null) await end(child);
    child = null;
  };
  return {
    address,
    stop,
    restart: async () => {
      await stop();
      child = await start(env, address);
    },
    close: async () => {
      await stop();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

function start(env: NodeJS.ProcessEnv, address: string): Promise<ChildProcess> {
  const child = spawn(process.execPath, ['api/cli/start.mjs'], { cwd: ROOT, env, stdio: ['ignore', 'pipe', 'pipe'] });
  return new Promise((resolve, reject) => {
    let said = '';
    const listen = (chunk: Buffer): void => {
      said += chunk.toString();
      if (said.includes(new URL(address).port) && /http:\/\//.test(said)) resolve(child);
    };
    child.stdout!.on('data', listen);
    child.stderr!.on('data', listen);
    child.once('exit', (code) => reject(new Error(`The server ended with ${code}:\n${said}`)));
  });
}

function end(child: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    child.once('exit', () => resolve());
    child.kill('SIGTERM');
  });
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(typeof address === 'object' && address !== null ? address.port : 0));
    });
  });
}
