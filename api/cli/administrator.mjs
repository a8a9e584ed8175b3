/** `npm run administrator -- --email … --name …`: the first administrator of a shop of your own. */
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { ensureBuilt } from './build.mjs';
import { ensureInstalled, ROOT } from './install.mjs';

try {
  ensureInstalled();
  ensureBuilt('api');
} catch (error) {
  process.stderr.write(`${error.message}\n`);
  process.exit(1);
}
await import(pathToFileURL(join(ROOT, 'dist', 'api', 'api', 'cli', 'add-administrator.js')).href);
