import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Model,
} from 'sequelize';
import type { ModelStatic, Sequelize } from 'sequelize';
import type { Unit } from '../../shared/part/document';

/**
 * A part with what the register shows of its newest revision, kept beside it so that the register never opens a document.
 * Rows are small on purpose: a search reads all of them.
 */
export interface PartRecord extends Model<InferAttributes<PartRecord>, InferCreationAttributes<PartRecord>> {
  id: string;
  number: string;
  /** The number as it sorts: HC-9 before HC-10. */
  numberKey: string;
  title: string;
  titleKey: string;
  /** Number, title and material, folded for the search. */
  searchText: string;
  createdAt: string;
  createdBy: string;
  changedAt: string;
  changedBy: string;
  /** Rises when number or title change. */
  version: CreationOptional<number>;
  revision: string;
  state: 'draft';
  unit: Unit;
  thickness: number | null;
  material: string | null;
  blankLength: number | null;
  blankWidth: number | null;
  bends: number;
  stops: number;
}

export const defineParts = (sequelize: Sequelize): ModelStatic<PartRecord> =>
  sequelize.define<PartRecord>(
    'part',
    {
      id: { type: DataTypes.STRING, primaryKey: true },
      number: { type: DataTypes.STRING, allowNull: false },
      numberKey: { type: DataTypes.STRING, allowNull: false },
      title: { type: DataTypes.STRING, allowNull: false },
      titleKey: { type: DataTypes.STRING, allowNull: false },
      searchText: { type: DataTypes.STRING, allowNull: false },
      createdAt: { type: DataTypes.STRING, allowNull: false },
      createdBy: { type: DataTypes.STRING, allowNull: false },
      changedAt: { type: DataTypes.STRING, allowNull: false },
      changedBy: { type: DataTypes.STRING, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      revision: { type: DataTypes.STRING, allowNull: false },
      state: { type: DataTypes.STRING, allowNull: false },
      unit: { type: DataTypes.STRING, allowNull: false },
      thickness: { type: DataTypes.DOUBLE },
      material: { type: DataTypes.STRING },
      blankLength: { type: DataTypes.DOUBLE },
      blankWidth: { type: DataTypes.DOUBLE },
      bends: { type: DataTypes.INTEGER, allowNull: false },
      stops: { type: DataTypes.INTEGER, allowNull: false },
    },
    { tableName: 'parts' },
  );
