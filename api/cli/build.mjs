/** Builds the app or the API when its sources are not the ones that the last build was made from. */
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT } from './install.mjs';

const WHAT = {
  app: {
    sources: ['src', 'shared', 'public-fonts', 'angular.json', 'tsconfig.json', 'package-lock.json'],
    result: 'dist/app/browser/index.html',
    command: ['node_modules/@angular/cli/bin/ng.js', 'build', '--progress=false'],
  },
  api: {
    sources: ['api', 'shared', 'tsconfig.json', 'package-lock.json'],
    result: 'dist/api/api/server.js',
    command: ['node_modules/typescript/bin/tsc', '-p', 'api/tsconfig.build.json'],
  },
};

/** Name, size and time of every source; a file that went away changes it as much as one that was edited. */
function fingerprint(sources, root) {
  const hash = createHash('sha256');
  const visit = (path) => {
    const full = join(root, path);
    const stat = statSync(full);
    if (stat.isDirectory()) for (const name of readdirSync(full).sort()) visit(join(path, name));
    else if (!path.endsWith('.spec.ts')) hash.update(`${path} ${stat.size} ${stat.mtimeMs}\n`);
  };
  for (const source of sources) if (existsSync(join(root, source))) visit(source);
  return hash.digest('hex');
}

const stampOf = (what, root) => join(root, 'dist', `${what}.stamp`);

/** @param {'app' | 'api'} what */
export function isBuilt(what, root = ROOT) {
  const stamp = stampOf(what, root);
  if (!existsSync(stamp) || !existsSync(join(root, WHAT[what].result))) return false;
  return readFileSync(stamp, 'utf8') === fingerprint(WHAT[what].sources, root);
}

/** @param {'app' | 'api'} what @param {{ quiet?: boolean }} options quiet: says nothing unless the build fails */
export function ensureBuilt(what, { quiet = false } = {}) {
  if (isBuilt(what)) return;
  const words = what === 'app' ? 'app' : 'API';
  if (!quiet) process.stderr.write(`Building the ${words} …\n`);
  // Taken before the build: a file saved while it runs makes the next start build again.
  const before = fingerprint(WHAT[what].sources, ROOT);
  rmSync(stampOf(what, ROOT), { force: true });
  const run = spawnSync(process.execPath, WHAT[what].command, {
    cwd: ROOT,
    stdio: ['ignore', quiet ? 'pipe' : 2, quiet ? 'pipe' : 2],
    env: { ...process.env, NG_CLI_ANALYTICS: 'false' },
  });
  if (run.status !== 0) {
    if (quiet) process.stderr.write(`${run.stdout}${run.stderr}`);
    throw new Error(`The ${words} could not be built; the messages above say where.`);
  }
  mkdirSync(join(ROOT, 'dist'), { recursive: true });
  writeFileSync(stampOf(what, ROOT), before);
}
