/** `npm start`: installs and builds what is missing or out of date, then opens the shop in this very process. */
import { join } from 'node:path';
import { setInterval } from 'node:timers';
import { pathToFileURL } from 'node:url';
import { ensureBuilt } from './build.mjs';
import { ensureInstalled, ROOT } from './install.mjs';

try {
  ensureInstalled();
  ensureBuilt('api');
  ensureBuilt('app');
} catch (error) {
  process.stderr.write(`${error.message}\n`);
  process.exit(1);
}
if (process.env.npm_lifecycle_event !== undefined) {
  // An npm that is told to end may leave its script behind; a shop that nobody can close would hold the port.
  const npm = process.ppid;
  setInterval(() => {
    if (process.ppid !== npm) process.kill(process.pid, 'SIGTERM');
  }, 250).unref();
}
process.env.NODE_ENV ??= 'production';
// No process of its own: Ctrl-C and the exit code are the server's without anything in between.
await import(pathToFileURL(join(ROOT, 'dist', 'api', 'api', 'server.js')).href);
