import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** The shape being worked on. `version` rises with every save. */
export interface DraftRecord {
  tankId: string;
  workshopId: string;
  design: string;
  designHash: string;
  version: number;
  savedBy: string;
  savedAt: Date;
}

export function defineDraft(sequelize: Sequelize): ModelStatic<Model<DraftRecord>> {
  return sequelize.define<Model<DraftRecord>>(
    'draft',
    {
      tankId: { type: DataTypes.CHAR(36), primaryKey: true, field: 'tank_id' },
      workshopId: { type: DataTypes.CHAR(36), allowNull: false, field: 'workshop_id' },
      design: { type: DataTypes.TEXT('medium'), allowNull: false },
      designHash: { type: DataTypes.CHAR(64), allowNull: false, field: 'design_hash' },
      version: { type: DataTypes.INTEGER, allowNull: false },
      savedBy: { type: DataTypes.CHAR(36), allowNull: false, field: 'saved_by' },
      savedAt: { type: DataTypes.DATE(3), allowNull: false, field: 'saved_at' },
    },
    { tableName: 'drafts' },
  );
}
