/** Starts the shop: web server, data directory, database, demo data where wanted; and stops it in order. */
import type { AddressInfo } from 'node:net';
import { createServer, type RequestListener, type Server } from 'node:http';
import { join } from 'node:path';
import { type App, createApp } from './app';
import { type Config, readConfig, StartRefused } from './config';
import { problem } from './middleware/problem';
import { makeLog } from './middleware/request-log';
import { answerUnreadable } from './middleware/unreadable-request';
import type { Database } from './models/database';
import { openShopDatabase } from './open-shop-database';
import { APP_VERSION, PACKAGE_ROOT } from './package-root';
import { greeting } from './greeting';
import { sessionSecret } from './session-secret';

/** How long open requests may take to end when the server is told to stop. */
const PATIENCE = 5000;

const notYet: RequestListener = (_request, response) => {
  const answer = problem('unavailable', { detail: 'The server is just starting.' });
  response.writeHead(answer.status, { 'Content-Type': 'application/problem+json', 'Retry-After': '2' });
  response.end(JSON.stringify(answer));
};

async function start(config: Config): Promise<void> {
  let answer = notYet;
  const server = createServer((request, response) => answer(request, response));
  server.on('clientError', answerUnreadable);
  // Before anything is made: a start that finds its port in use leaves nothing behind.
  await listen(server, config);
  try {
    const { app, database } = await open(config);
    answer = app.express;
    stopOnSignal(server, app, database);
  } catch (error) {
    server.close();
    server.closeAllConnections();
    throw error;
  }
  process.exitCode = 0;
  process.stdout.write(greeting(config, (server.address() as AddressInfo).port));
}

async function open(config: Config): Promise<{ app: App; database: Database }> {
  const database = await openShopDatabase(config);
  try {
    const app = createApp({
      database,
      secret: sessionSecret(config),
      log: makeLog(config),
      version: APP_VERSION,
      appFolder: join(PACKAGE_ROOT, 'dist', 'app', 'browser'),
      trustedProxies: config.trustedProxies,
      now: () => new Date(),
    });
    return { app, database };
  } catch (error) {
    await database.close();
    throw error;
  }
}

function stopOnSignal(server: Server, app: App, database: Database): void {
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
  // Until the shop is open: a process that runs out of things to do has not started.
  process.exitCode = 1;
  try {
    await start(readConfig(process.env));
  } catch (error) {
    const words = error instanceof StartRefused ? error.message : error instanceof Error ? error.stack : String(error);
    process.stderr.write(`Leafwright did not start. ${words}\n`);
    process.exit(1);
  }
}

void main();
