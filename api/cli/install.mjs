/** Installs the packages of the lock file when they are missing or older than it. Plain JavaScript: nothing is installed yet. */
import { spawnSync } from 'node:child_process';
import { existsSync, lstatSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = join(dirname(fileURLToPath(import.meta.url)), '..', '..');

/**
 * Whether node_modules holds what the lock file asks for. Compared by content: a fresh checkout gives every file a new time.
 *
 * @returns {boolean}
 */
export function isInstalled(root = ROOT) {
  const wanted = packagesOf(join(root, 'package-lock.json'));
  // npm writes this copy last, when everything is in its place.
  const there = packagesOf(join(root, 'node_modules', '.package-lock.json'));
  if (wanted === null || there === null) return false;
  return Object.entries(wanted).every(
    ([path, { version, optional, peer }]) =>
      path === '' || optional || (peer && !(path in there)) || there[path]?.version === version,
  );
}

/** @returns {Record<string, { version?: string, optional?: boolean, peer?: boolean }> | null} null when there is no such file */
function packagesOf(file) {
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')).packages : null;
}

/** Tells an unsuitable Node from a broken program: the packages fail in odd ways on an older one. */
function checkNode() {
  const { engines } = JSON.parse(readFileSync(join(ROOT, 'package.json'), 'utf8'));
  const [major, minor] = process.versions.node.split('.').map(Number);
  if ((major === 20 && minor >= 19) || (major === 22 && minor >= 12) || major > 22) return;
  throw new Error(`Leafwright needs Node ${engines.node}; this is ${process.versions.node}.`);
}

/** Progress goes to standard error, so that commands keep standard output for their answers. */
export function ensureInstalled() {
  checkNode();
  if (isInstalled()) return;
  const modules = join(ROOT, 'node_modules');
  if (existsSync(modules) && lstatSync(modules).isSymbolicLink()) {
    // npm would empty the folder behind the link, which belongs to somebody else.
    throw new Error('node_modules is a link to another folder and does not fit the lock file; remove the link first.');
  }
  process.stderr.write('Installing packages (once; sqlite3 may be compiled, which takes a minute or two) …\n');
  const npm = process.env.npm_execpath;
  const options = { cwd: ROOT, stdio: ['ignore', 2, 2], env: { ...process.env, NODE_ENV: 'development' } };
  const args = ['ci', '--no-audit', '--no-fund'];
  const run = npm
    ? spawnSync(process.execPath, [npm, ...args], options)
    : spawnSync('npm', args, { ...options, shell: process.platform === 'win32' });
  if (run.status !== 0) {
    throw new Error(
      'The packages could not be installed; npm says why above. ' +
        'Compiling sqlite3 needs python3, make and a C++ compiler; on a closed network set npm_config_nodedir.',
    );
  }
}
