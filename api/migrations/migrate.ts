/** Brings a database up to this program's tables. */
import { Umzug } from 'umzug';
import { StartRefused } from '../config';
import type { Database } from '../models/database';
import { MIGRATIONS, type ShopMigration } from './migrations';

const APPLIED = 'CREATE TABLE IF NOT EXISTS migrations (name TEXT PRIMARY KEY, applied_at TEXT NOT NULL)';

async function applied(database: Database): Promise<string[]> {
  await database.inTurn(() => database.sequelize.query(APPLIED));
  const [rows] = await database.sequelize.query('SELECT name FROM migrations ORDER BY name');
  return (rows as { name: string }[]).map((row) => row.name);
}

/** One migration is one transaction, its own entry in the list included: it is there whole or not at all. */
function apply(database: Database, migration: ShopMigration): Promise<void> {
  return database.write(async (transaction) => {
    for (const statement of migration.statements) await database.sequelize.query(statement, { transaction });
    await database.sequelize.query('INSERT INTO migrations (name, applied_at) VALUES (?, ?)', {
      replacements: [migration.name, new Date().toISOString()],
      transaction,
    });
  });
}

export async function migrate(database: Database, migrations = MIGRATIONS): Promise<string[]> {
  const known = new Set(migrations.map((migration) => migration.name));
  const unknown = (await applied(database)).filter((name) => !known.has(name));
  if (unknown.length > 0) {
    throw new StartRefused(
      `The database ${database.file} was written by a newer Leafwright (it knows ${unknown.join(', ')}). ` +
        'Start that version, or use another DATA_DIR.',
    );
  }
  const umzug = new Umzug({
    migrations: migrations.map((migration) => ({ name: migration.name, up: () => apply(database, migration) })),
    storage: {
      executed: () => applied(database),
      logMigration: () => Promise.resolve(),
      unlogMigration: () => Promise.reject(new Error('Migrations are not taken back.')),
    },
    logger: undefined,
  });
  return (await umzug.up()).map((done) => done.name);
}
