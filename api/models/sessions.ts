import { DataTypes, type InferAttributes, type InferCreationAttributes, type Model } from 'sequelize';
import type { ModelStatic, Sequelize } from 'sequelize';

/** Sign-ins that are open, in the shape that the session store writes. */
export interface SessionRecord extends Model<InferAttributes<SessionRecord>, InferCreationAttributes<SessionRecord>> {
  sid: string;
  expires: Date;
  data: string;
}

export const SESSION_MODEL = 'session';

export const defineSessions = (sequelize: Sequelize): ModelStatic<SessionRecord> =>
  sequelize.define<SessionRecord>(
    SESSION_MODEL,
    {
      sid: { type: DataTypes.STRING, primaryKey: true },
      expires: { type: DataTypes.DATE, allowNull: false },
      data: { type: DataTypes.TEXT, allowNull: false },
    },
    { tableName: 'sessions' },
  );
