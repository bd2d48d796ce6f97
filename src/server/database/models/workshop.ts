import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface WorkshopRecord {
  id: string;
  name: string;
  createdAt: Date;
}

export function defineWorkshop(sequelize: Sequelize): ModelStatic<Model<WorkshopRecord>> {
  return sequelize.define<Model<WorkshopRecord>>(
    'workshop',
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      name: { type: DataTypes.STRING(120), allowNull: false },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, field: 'created_at' },
    },
    { tableName: 'workshops' },
  );
}
