/** The shop's database: one SQLite file, its tables, and the one way to write to it. */
import { Sequelize, Transaction } from 'sequelize';
import { definePeople } from './people';
import { defineParts } from './parts';
import { defineRevisionEditors, defineRevisions } from './revisions';
import { defineSessions } from './sessions';
import { defineShop } from './shop';
import { sqliteDialect } from './sqlite-dialect';
import { WriteQueue } from './write-queue';

export function openDatabase(file: string) {
  const sequelize = new Sequelize({
    dialect: 'sqlite',
    dialectModule: sqliteDialect,
    storage: file,
    logging: false,
    define: { timestamps: false, underscored: true },
  });
  const queue = new WriteQueue();
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
    close: (): Promise<void> => queue.run(() => sequelize.close()),
  };
}

export type Database = ReturnType<typeof openDatabase>;
