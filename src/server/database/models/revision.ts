import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** What was issued: never updated, never removed. */
export interface RevisionRecord {
  id: string;
  workshopId: string;
  tankId: string;
  number: number;
  letter: string;
  design: string;
  settings: string;
  contentHash: string;
  stepMm: number;
  heightMm: number;
  levelPerReading: number;
  capacityL: number;
  errorL: number;
  /** Closer rows included. */
  rowCount: number;
  /** null: issued before it was frozen. */
  brimPlusMinusL: number | null;
  hash: string;
  note: string | null;
  issuedBy: string;
  issuedAt: Date;
}

export function defineRevision(sequelize: Sequelize): ModelStatic<Model<RevisionRecord>> {
  return sequelize.define<Model<RevisionRecord>>(
    'revision',
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      workshopId: { type: DataTypes.CHAR(36), allowNull: false, field: 'workshop_id' },
      tankId: { type: DataTypes.CHAR(36), allowNull: false, field: 'tank_id' },
      number: { type: DataTypes.INTEGER, allowNull: false },
      letter: { type: DataTypes.STRING(8), allowNull: false },
      design: { type: DataTypes.TEXT('medium'), allowNull: false },
      settings: { type: DataTypes.TEXT, allowNull: false },
      contentHash: { type: DataTypes.CHAR(64), allowNull: false, field: 'content_hash' },
      stepMm: { type: DataTypes.DOUBLE, allowNull: false, field: 'step_mm' },
      heightMm: { type: DataTypes.DOUBLE, allowNull: false, field: 'height_mm' },
      levelPerReading: { type: DataTypes.DOUBLE, allowNull: false, field: 'level_per_reading' },
      capacityL: { type: DataTypes.DOUBLE, allowNull: false, field: 'capacity_l' },
      errorL: { type: DataTypes.DOUBLE, allowNull: false, field: 'error_l' },
      rowCount: { type: DataTypes.INTEGER, allowNull: false, field: 'row_count' },
      brimPlusMinusL: { type: DataTypes.DOUBLE, allowNull: true, field: 'brim_plus_minus_l' },
      hash: { type: DataTypes.CHAR(64), allowNull: false },
      note: { type: DataTypes.STRING(500), allowNull: true },
      issuedBy: { type: DataTypes.CHAR(36), allowNull: false, field: 'issued_by' },
      issuedAt: { type: DataTypes.DATE(3), allowNull: false, field: 'issued_at' },
    },
    { tableName: 'revisions' },
  );
}
