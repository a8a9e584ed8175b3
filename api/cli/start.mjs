/** `npm start`: installs and builds what is missing or out of date, then opens the shop in this very process. */
import { join } from 'node:path';
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
process.env.NODE_ENV ??= 'production';
// No process of its own: Ctrl-C and the exit code are the server's without anything in between.
await import(pathToFileURL(join(ROOT, 'dist', 'api', 'api', 'server.js')).href);
