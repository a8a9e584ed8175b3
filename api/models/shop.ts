import { DataTypes, type InferAttributes, type InferCreationAttributes, type Model } from 'sequelize';
import type { ModelStatic, Sequelize } from 'sequelize';
import type { ShopKind } from '../config';

/** The one shop that a data directory belongs to; the table has one row. */
export interface ShopRecord extends Model<InferAttributes<ShopRecord>, InferCreationAttributes<ShopRecord>> {
  id: number;
  name: string;
  kind: ShopKind;
  createdAt: string;
  /** When a new shop had all that it starts with; null while its first start is not through. */
  filledAt: string | null;
}

export const defineShop = (sequelize: Sequelize): ModelStatic<ShopRecord> =>
  sequelize.define<ShopRecord>(
    'shop',
    {
      id: { type: DataTypes.INTEGER, primaryKey: true },
      name: { type: DataTypes.STRING, allowNull: false },
      kind: { type: DataTypes.STRING, allowNull: false },
      createdAt: { type: DataTypes.STRING, allowNull: false },
      filledAt: { type: DataTypes.STRING },
    },
    { tableName: 'shop' },
  );
