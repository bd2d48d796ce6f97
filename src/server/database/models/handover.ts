import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** A tank that an owner may see. */
export interface HandoverRecord {
  tankId: string;
  userId: string;
  workshopId: string;
  handedOverBy: string;
  handedOverAt: Date;
}

export function defineHandover(sequelize: Sequelize): ModelStatic<Model<HandoverRecord>> {
  return sequelize.define<Model<HandoverRecord>>(
    'handover',
    {
      tankId: { type: DataTypes.CHAR(36), primaryKey: true, field: 'tank_id' },
      userId: { type: DataTypes.CHAR(36), primaryKey: true, field: 'user_id' },
      workshopId: { type: DataTypes.CHAR(36), allowNull: false, field: 'workshop_id' },
      handedOverBy: { type: DataTypes.CHAR(36), allowNull: false, field: 'handed_over_by' },
      handedOverAt: { type: DataTypes.DATE(3), allowNull: false, field: 'handed_over_at' },
    },
    { tableName: 'handovers' },
  );
}
