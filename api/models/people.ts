import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
} from 'sequelize';
import type { ModelStatic, Sequelize } from 'sequelize';
import type { Role } from '../../shared/contracts/session';

export interface PersonRow extends Model<InferAttributes<PersonRow>, InferCreationAttributes<PersonRow>> {
  id: string;
  /** Lower case: an address is one person, however it is typed. */
  email: string;
  name: string;
  passwordHash: string;
  roles: Role[];
  active: CreationOptional<boolean>;
  createdAt: string;
}

export const definePeople = (sequelize: Sequelize): ModelStatic<PersonRow> =>
  sequelize.define<PersonRow>(
    'person',
    {
      id: { type: DataTypes.STRING, primaryKey: true },
      email: { type: DataTypes.STRING, allowNull: false },
      name: { type: DataTypes.STRING, allowNull: false },
      passwordHash: { type: DataTypes.STRING, allowNull: false },
      roles: { type: DataTypes.JSON, allowNull: false },
      active: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
      createdAt: { type: DataTypes.STRING, allowNull: false },
    },
    { tableName: 'people' },
  );
