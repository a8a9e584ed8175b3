import { DataTypes, type InferAttributes, type InferCreationAttributes, type Model } from 'sequelize';
import type { ModelStatic, Sequelize } from 'sequelize';

/** A revision: the document as saved and the result as the server computed it then, both as JSON text. */
export interface RevisionRecord extends Model<
  InferAttributes<RevisionRecord>,
  InferCreationAttributes<RevisionRecord>
> {
  id: string;
  partId: string;
  letter: string;
  state: 'draft';
  version: number;
  document: string;
  result: string;
  /** Outline of the formed section for the register, as JSON text. */
  outline: string | null;
  engineVersion: string;
  createdAt: string;
  createdBy: string;
  changedAt: string;
  changedBy: string;
}

export const defineRevisions = (sequelize: Sequelize): ModelStatic<RevisionRecord> =>
  sequelize.define<RevisionRecord>(
    'revision',
    {
      id: { type: DataTypes.STRING, primaryKey: true },
      partId: { type: DataTypes.STRING, allowNull: false },
      letter: { type: DataTypes.STRING, allowNull: false },
      state: { type: DataTypes.STRING, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      document: { type: DataTypes.TEXT, allowNull: false },
      result: { type: DataTypes.TEXT, allowNull: false },
      outline: { type: DataTypes.TEXT },
      engineVersion: { type: DataTypes.STRING, allowNull: false },
      createdAt: { type: DataTypes.STRING, allowNull: false },
      createdBy: { type: DataTypes.STRING, allowNull: false },
      changedAt: { type: DataTypes.STRING, allowNull: false },
      changedBy: { type: DataTypes.STRING, allowNull: false },
    },
    { tableName: 'revisions' },
  );

/** Who has edited a revision, from when to when. */
export interface RevisionEditorRecord extends Model<
  InferAttributes<RevisionEditorRecord>,
  InferCreationAttributes<RevisionEditorRecord>
> {
  revisionId: string;
  personId: string;
  firstEditAt: string;
  lastEditAt: string;
}

export const defineRevisionEditors = (sequelize: Sequelize): ModelStatic<RevisionEditorRecord> =>
  sequelize.define<RevisionEditorRecord>(
    'revisionEditor',
    {
      revisionId: { type: DataTypes.STRING, primaryKey: true },
      personId: { type: DataTypes.STRING, primaryKey: true },
      firstEditAt: { type: DataTypes.STRING, allowNull: false },
      lastEditAt: { type: DataTypes.STRING, allowNull: false },
    },
    { tableName: 'revision_editors' },
  );
