/** Where this package lies: the same answer from the sources and from the compiled output. */
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';

function findRoot(from: string): string {
  for (let folder = from; ; folder = dirname(folder)) {
    if (existsSync(join(folder, 'package.json'))) return folder;
    if (folder === dirname(folder)) throw new Error(`No package.json above ${from}.`);
  }
}

export const PACKAGE_ROOT = findRoot(__dirname);

export const APP_VERSION = (JSON.parse(readFileSync(join(PACKAGE_ROOT, 'package.json'), 'utf8')) as { version: string })
  .version;
