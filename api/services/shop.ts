/** The shop that this data directory belongs to. */
import type { z } from 'zod';
import type { shopSchema } from '../../shared/contracts/session';
import { type Config, type ShopKind, StartRefused } from '../config';
import type { Database } from '../models/database';
import type { ShopRecord } from '../models/shop';
import { DEMO_PASSWORD, DEMO_PEOPLE, DEMO_SHOP_NAME } from '../demo-shop';

const WORDS = { demo: 'a demo shop', own: 'a shop of your own' } as const;

/** The data directory is for another kind of shop than this start. */
export class OtherShop extends StartRefused {
  constructor(
    readonly kind: ShopKind,
    words: string,
  ) {
    super(words);
  }
}

export const readShop = (database: Database): Promise<ShopRecord | null> => database.shop.findByPk(1, { raw: true });

/** Founds the shop on the first start; later a start must be for the same kind. Says whether it still has to be filled. */
export async function openShop(
  database: Database,
  config: Pick<Config, 'shop' | 'shopName' | 'dataDir'>,
  now: Date,
): Promise<{ toFill: boolean }> {
  return database.write(async (transaction) => {
    const shop = await database.shop.findByPk(1, { transaction });
    if (!shop) {
      const name = config.shop === 'demo' ? DEMO_SHOP_NAME : (config.shopName ?? 'Our shop');
      const founded = { id: 1, name, kind: config.shop, createdAt: now.toISOString(), filledAt: null };
      await database.shop.create(founded, { transaction });
      return { toFill: true };
    }
    if (shop.kind !== config.shop) {
      throw new OtherShop(
        shop.kind,
        `${config.dataDir} holds ${WORDS[shop.kind]}; this start is for ${WORDS[config.shop]}. ` +
          `Set SHOP=${shop.kind}, or give another DATA_DIR.`,
      );
    }
    if (shop.kind === 'own' && config.shopName !== null && config.shopName !== shop.name) {
      await shop.update({ name: config.shopName }, { transaction });
    }
    return { toFill: shop.filledAt === null };
  });
}

export const shopFilled = (database: Database, now: Date): Promise<unknown> =>
  database.write((transaction) =>
    database.shop.update({ filledAt: now.toISOString() }, { where: { id: 1 }, transaction }),
  );

export async function describeShop(database: Database): Promise<z.infer<typeof shopSchema>> {
  const shop = await readShop(database);
  if (!shop) throw new Error('The database has no shop.');
  if (shop.kind === 'own') return { name: shop.name, demo: false };
  return {
    name: shop.name,
    demo: true,
    demoSignIns: DEMO_PEOPLE.map(({ email, roles }) => ({ email, roles: [...roles] })),
    demoPassword: DEMO_PASSWORD,
  };
}
