/** The database of a data directory, brought up to date and known to be of the right kind. */
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { Config } from './config';
import { migrate } from './migrations/migrate';
import { type Database, openDatabase } from './models/database';
import { seedDemo } from './seeders/demo/seed-demo';
import { openShop, shopFilled } from './services/shop';

export async function openShopDatabase(
  config: Pick<Config, 'dataDir' | 'shop' | 'shopName'>,
  now = new Date(),
  seed: typeof seedDemo = seedDemo,
): Promise<Database> {
  mkdirSync(config.dataDir, { recursive: true });
  const database = openDatabase(join(config.dataDir, 'leafwright.sqlite'));
  try {
    await migrate(database);
    const { toFill } = await openShop(database, config, now);
    if (toFill && config.shop === 'demo') await seed(database, now);
    if (toFill) await shopFilled(database, now);
    return database;
  } catch (error) {
    await database.close();
    throw error;
  }
}
