/**
 * SQLite as Sequelize is to open it. Sequelize opens a connection of its own for each transaction and offers no hook after it,
 * so the settings that keep the data safe are made here, where every connection is born.
 */
import sqlite3 from 'sqlite3';

const SETTINGS = [
  'PRAGMA busy_timeout = 5000',
  'PRAGMA journal_mode = WAL',
  // FULL: a saved part is on the disk when the answer says so, also through a power cut.
  'PRAGMA synchronous = FULL',
  'PRAGMA foreign_keys = ON',
].join('; ');

class ShopDatabase extends sqlite3.Database {
  constructor(file: string, mode: number, opened: (error: Error | null) => void) {
    super(file, mode, (error: Error | null) => {
      if (error) opened(error);
      else this.exec(SETTINGS, opened);
    });
  }
}

export const sqliteDialect = { ...sqlite3, Database: ShopDatabase };
