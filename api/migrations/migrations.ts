/** Every migration, in order. A static list: it runs the same from the sources and compiled. */
import { firstShop } from './0001-first-shop';
import { partVersion } from './0002-part-version';

export interface ShopMigration {
  readonly name: string;
  readonly statements: readonly string[];
}

export const MIGRATIONS: readonly ShopMigration[] = [firstShop, partVersion];
