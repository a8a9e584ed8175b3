/**
 * SQLite as Sequelize is to open it. Sequelize opens a connection of its own for each transaction and offers no hook after it,
 * so the settings that keep the data safe are made here, where every connection is born.
 */
import sqlite3 from 'sqlite3';

type Done = (error: Error | null) => void;

/** @param busyTimeout milliseconds that a statement waits while another program holds the database */
export function sqliteDialect(busyTimeout: number) {
  const settings = [
    `PRAGMA busy_timeout = ${busyTimeout}`,
    'PRAGMA journal_mode = WAL',
    // FULL: a saved part is on the disk when the answer says so, also through a power cut.
    'PRAGMA synchronous = FULL',
    'PRAGMA foreign_keys = ON',
  ].join('; ');

  class ShopDatabase extends sqlite3.Database {
    #open = false;

    constructor(file: string, mode: number, opened: Done) {
      super(file, mode, (error: Error | null) => {
        if (error) {
          opened(error);
          return;
        }
        this.exec(settings, (failed) => {
          if (!failed) {
            this.#open = true;
            opened(null);
          } else super.close(() => opened(failed));
        });
      });
    }

    /** The library never calls back from closing what did not open. */
    override close(closed?: Done): void {
      if (this.#open) super.close(closed);
      else closed?.(null);
    }
  }

  return { ...sqlite3, Database: ShopDatabase };
}
