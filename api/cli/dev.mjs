/** `npm run dev`: the API and the app in watch mode, side by side. The app is at http://localhost:4200. */
import { ensureInstalled, ROOT } from './install.mjs';

try {
  ensureInstalled();
} catch (error) {
  process.stderr.write(`${error.message}\n`);
  process.exit(1);
}

const { concurrently } = await import('concurrently');
const node = JSON.stringify(process.execPath);
const { result } = concurrently(
  [
    { name: 'api', command: `${node} node_modules/tsx/dist/cli.mjs watch api/server.ts` },
    { name: 'app', command: `${node} node_modules/@angular/cli/bin/ng.js serve` },
  ],
  // When one of them ends, the other has nothing to work with.
  { cwd: ROOT, killOthersOn: ['failure', 'success'], prefix: 'name', handleInput: false },
);
// Concurrently passes Ctrl-C on to both and waits for them.
result.then(
  () => process.exit(0),
  () => process.exit(process.exitCode ?? 1),
);
