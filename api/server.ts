/** Starts the shop: data directory, database, demo data where wanted, web server; and stops it in order. */
import { mkdirSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { createServer, type Server } from 'node:http';
import { join } from 'node:path';
import { createApp } from './app';
import { type Config, readConfig, StartRefused } from './config';
import { makeLog } from './middleware/request-log';
import { openShopDatabase } from './open-shop-database';
import { APP_VERSION, PACKAGE_ROOT } from './package-root';
import { greeting } from './greeting';
import { sessionSecret } from './session-secret';

/** How long open requests may take to end when the server is told to stop. */
const PATIENCE = 5000;

async function start(config: Config): Promise<void> {
  mkdirSync(config.dataDir, { recursive: true });
  const log = makeLog(config);
  const database = await openShopDatabase(config);
  const app = createApp({
    database,
    secret: sessionSecret(config),
    log,
    version: APP_VERSION,
    appFolder: join(PACKAGE_ROOT, 'dist', 'app', 'browser'),
    trustedProxies: config.trustedProxies,
    now: () => new Date(),
  });
  const server = createServer(app.express);
  try {
    await listen(server, config);
  } catch (error) {
    await database.close();
    throw error;
  }
  process.stdout.write(greeting(config, (server.address() as AddressInfo).port));

  let stopping = false;
  const stop = (): void => {
    if (stopping) return;
    stopping = true;
    const late = setTimeout(() => server.closeAllConnections(), PATIENCE);
    server.close(() => {
      clearTimeout(late);
      app.stop();
      database.close().then(
        () => process.exit(0),
        () => process.exit(1),
      );
    });
    server.closeIdleConnections();
  };
  process.on('SIGINT', stop);
  process.on('SIGTERM', stop);
}

function listen(server: Server, { port, host }: Config): Promise<void> {
  return new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      if (error.code === 'EADDRINUSE') {
        reject(new StartRefused(`Port ${port} is in use. Stop what uses it, or choose another with PORT.`));
      } else if (error.code === 'EACCES') {
        reject(new StartRefused(`Port ${port} needs more rights than this process has. Choose another with PORT.`));
      } else if (error.code === 'EADDRNOTAVAIL' || error.code === 'ENOTFOUND') {
        reject(new StartRefused(`HOST=${host} is not an address of this machine.`));
      } else reject(error);
    });
    server.listen(port, host, resolve);
  });
}

async function main(): Promise<void> {
  try {
    await start(readConfig(process.env));
  } catch (error) {
    const words = error instanceof StartRefused ? error.message : error instanceof Error ? error.stack : String(error);
    process.stderr.write(`Leafwright did not start. ${words}\n`);
    process.exit(1);
  }
}

void main();
