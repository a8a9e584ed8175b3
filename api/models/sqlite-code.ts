/** What SQLite says went wrong, however Sequelize has wrapped it: `SQLITE_BUSY`, or nothing. */
import { BaseError } from 'sequelize';

export function sqliteCode(error: unknown): string {
  const original = error instanceof BaseError && 'original' in error ? error.original : error;
  const code = (original as { code?: unknown } | null | undefined)?.code;
  return typeof code === 'string' && code.startsWith('SQLITE_') ? code : '';
}
