/** The shop's database: one SQLite file, its tables, and the one way to write to it. */
import { Sequelize, Transaction } from 'sequelize';
import { OneAtATime } from './one-at-a-time';
import { definePeople } from './people';
import { defineParts } from './parts';
import { defineRevisionEditors, defineRevisions } from './revisions';
import { defineSessions } from './sessions';
import { defineShop } from './shop';
import { sqliteDialect } from './sqlite-dialect';

/** Milliseconds that a writer waits: inside SQLite for another program, and before that for the writers in front. */
export interface Waits {
  readonly busy: number;
  readonly queue: number;
}

const WAITS: Waits = { busy: 5000, queue: 5000 };

export function openDatabase(file: string, waits = WAITS) {
  const sequelize = new Sequelize({
    dialect: 'sqlite',
    dialectModule: sqliteDialect(waits.busy),
    storage: file,
    logging: false,
    // SQLite has waited already; Sequelize would send the statement five times more.
    retry: { max: 1 },
    define: { timestamps: false, underscored: true },
  });
  // One writer at a time: SQLite allows no more, and writers that wait inside it hold the threads that the one in front needs
  // to commit. Who waits here costs nothing, and can be told no before any of the work is done.
  const queue = new OneAtATime({ patience: waits.queue });
  return {
    file,
    sequelize,
    people: definePeople(sequelize),
    parts: defineParts(sequelize),
    revisions: defineRevisions(sequelize),
    revisionEditors: defineRevisionEditors(sequelize),
    sessions: defineSessions(sequelize),
    shop: defineShop(sequelize),
    /** Work that writes, in turn, without a transaction of its own (a single statement). */
    inTurn: <T>(work: () => Promise<T>): Promise<T> => queue.run(work),
    /** Work that writes, in turn, all of it or nothing. */
    write: <T>(work: (transaction: Transaction) => Promise<T>): Promise<T> =>
      queue.run(() => sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, work)),
    close: (): Promise<void> => queue.run(() => sequelize.close(), { patience: null }),
  };
}

export type Database = ReturnType<typeof openDatabase>;
