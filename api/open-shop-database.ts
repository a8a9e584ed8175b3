/** The database of a data directory, brought up to date and known to be of the right kind. */
import type { Config } from './config';
import { prepareDataFolder } from './data-folder';
import { migrate } from './migrations/migrate';
import { type Database, openDatabase, type Waits } from './models/database';
import { seedDemo } from './seeders/demo/seed-demo';
import { openShop, shopFilled } from './services/shop';
import { startRefusal } from './start-refusal';

type Wanted = Pick<Config, 'dataDir' | 'shop' | 'shopName'>;

export async function openShopDatabase(
  config: Wanted,
  now = new Date(),
  seed: typeof seedDemo = seedDemo,
  waits?: Waits,
): Promise<Database> {
  try {
    const database = openDatabase(prepareDataFolder(config.dataDir), waits);
    try {
      await fill(database, config, now, seed);
      return database;
    } catch (error) {
      await database.close();
      throw error;
    }
  } catch (error) {
    throw startRefusal(error, config.dataDir);
  }
}

async function fill(database: Database, config: Wanted, now: Date, seed: typeof seedDemo): Promise<void> {
  await migrate(database);
  const { toFill } = await openShop(database, config, now);
  if (toFill && config.shop === 'demo') await seed(database, now);
  if (toFill) await shopFilled(database, now);
}
