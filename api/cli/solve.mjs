/** `npm run --silent solve`: nothing but results may reach standard output, so everything else goes to standard error. */
import { ensureInstalled } from './install.mjs';
import { ensureBuilt } from './build.mjs';

ensureInstalled();
ensureBuilt('api', { quiet: true });
await import('../../dist/api/api/cli/solve.js');
