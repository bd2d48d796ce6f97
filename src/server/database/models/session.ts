import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** `expiresAt` moves on while the session is used; `endsAt` never does. */
export interface SessionRecord {
  tokenHash: string;
  workshopId: string;
  userId: string;
  createdAt: Date;
  expiresAt: Date;
  endsAt: Date;
}

export function defineSession(sequelize: Sequelize): ModelStatic<Model<SessionRecord>> {
  return sequelize.define<Model<SessionRecord>>(
    'session',
    {
      tokenHash: { type: DataTypes.CHAR(64), primaryKey: true, field: 'token_hash' },
      workshopId: { type: DataTypes.CHAR(36), allowNull: false, field: 'workshop_id' },
      userId: { type: DataTypes.CHAR(36), allowNull: false, field: 'user_id' },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, field: 'created_at' },
      expiresAt: { type: DataTypes.DATE(3), allowNull: false, field: 'expires_at' },
      endsAt: { type: DataTypes.DATE(3), allowNull: false, field: 'ends_at' },
    },
    { tableName: 'sessions' },
  );
}
