import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface UserRecord {
  id: string;
  name: string;
  email: string;
  passwordHash: string;
  createdAt: Date;
}

export function defineUser(sequelize: Sequelize): ModelStatic<Model<UserRecord>> {
  return sequelize.define<Model<UserRecord>>(
    'user',
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      name: { type: DataTypes.STRING(120), allowNull: false },
      email: { type: DataTypes.STRING(254), allowNull: false },
      passwordHash: { type: DataTypes.STRING(200), allowNull: false, field: 'password_hash' },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, field: 'created_at' },
    },
    { tableName: 'users' },
  );
}
