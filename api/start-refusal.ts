/** What keeps a data folder from being used, in a sentence for the person who starts the server. */
import { StartRefused } from './config';
import { sqliteCode } from './models/sqlite-code';

const ELSE = 'or give another DATA_DIR.';

/** By SQLite's code: the words go on after "The database in <folder>". */
const DATABASE: Readonly<Record<string, string>> = {
  SQLITE_CANTOPEN: `can’t be opened. Let this process read and write the folder, ${ELSE}`,
  SQLITE_PERM: `can’t be opened. Let this process read and write the folder, ${ELSE}`,
  SQLITE_READONLY: `can only be read. Let this process write the folder and what is in it, ${ELSE}`,
  SQLITE_NOTADB: `is not a Leafwright database (leafwright.sqlite is something else). Put a copy of it back, ${ELSE}`,
  SQLITE_CORRUPT: `is damaged. Put a copy of it back, ${ELSE}`,
  SQLITE_BUSY: 'is held by another program. Close that one and start again.',
  SQLITE_LOCKED: 'is held by another program. Close that one and start again.',
  SQLITE_FULL: `can’t be written: the disk is full. Make room, ${ELSE}`,
  SQLITE_IOERR: `could not be read or written: the disk reports an error. Look after the disk, ${ELSE}`,
};

/** By the system's code. */
const FILES: Readonly<Record<string, (path: string) => string>> = {
  EACCES: (path) => `This process has no right to use ${path}. Give it that right, ${ELSE}`,
  EPERM: (path) => `This process has no right to use ${path}. Give it that right, ${ELSE}`,
  EROFS: (path) => `${path} can only be read. Make it writable, ${ELSE}`,
  EEXIST: (path) => `${path} is not a folder. Move it away, ${ELSE}`,
  ENOTDIR: (path) => `${path} is not a folder. Move what stands in its way, ${ELSE}`,
  EISDIR: (path) => `${path} is a folder where a file should be. Move it away, ${ELSE}`,
  ENOSPC: (path) => `${path} can’t be written: the disk is full. Make room, ${ELSE}`,
  EDQUOT: (path) => `${path} can’t be written: the disk is full. Make room, ${ELSE}`,
  ENOENT: (path) => `${path} can’t be made. Check how it is written, ${ELSE}`,
};

/** @returns the refusal; or the error itself, when it is one already, or a bug */
export function startRefusal(error: unknown, dataDir: string): unknown {
  if (error instanceof StartRefused) return error;
  const words = DATABASE[sqliteCode(error)];
  if (words !== undefined) return new StartRefused(`The database in ${dataDir} ${words}`, { cause: error });
  const { code, path } = Object(error) as NodeJS.ErrnoException;
  const sentence = code === undefined ? undefined : FILES[code];
  return sentence ? new StartRefused(sentence(path ?? dataDir), { cause: error }) : error;
}
