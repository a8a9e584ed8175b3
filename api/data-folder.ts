/** The folder that holds the shop: for the account that runs the server, and for no other of the machine. */
import {
  accessSync,
  chmodSync,
  closeSync,
  constants,
  existsSync,
  mkdirSync,
  openSync,
  readdirSync,
  statSync,
} from 'node:fs';
import { join } from 'node:path';

const DATABASE = 'leafwright.sqlite';
const OURS = new Set([DATABASE, `${DATABASE}-wal`, `${DATABASE}-shm`, `${DATABASE}-journal`, 'session-secret']);

/** Makes the folder and the file where they are missing. @returns the file of the database */
export function prepareDataFolder(dataDir: string): string {
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  const names = readdirSync(dataDir);
  // A folder that holds other things too is somebody else's to open or close.
  if (names.every((name) => OURS.has(name))) tighten(dataDir, 0o700);
  const file = join(dataDir, DATABASE);
  // SQLite takes an empty file for a new database, and gives what it lays beside it the same rights.
  if (!existsSync(file)) closeSync(openSync(file, 'a', 0o600));
  for (const name of names) if (OURS.has(name)) tighten(join(dataDir, name), 0o600);
  // SQLite opens a file that can only be read without a word, and fails at the first save.
  accessSync(file, constants.R_OK | constants.W_OK);
  return file;
}

/** Takes rights away, never gives any. */
function tighten(path: string, most: number): void {
  try {
    const mode = statSync(path).mode & 0o777;
    if ((mode & ~most) !== 0) chmodSync(path, mode & most);
  } catch (error) {
    // Of another account, or on a disk that knows no rights: whether it can be used shows when it is.
    if (!['EPERM', 'ENOTSUP', 'EROFS', 'ENOENT'].includes((error as NodeJS.ErrnoException).code ?? '')) throw error;
  }
}
