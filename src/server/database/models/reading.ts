import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface ReadingRecord {
  id: string;
  workshopId: string;
  tankId: string;
  revisionId: string;
  idempotencyKey: string;
  bodyHash: string;
  takenAt: Date;
  depthMm: number;
  volumeL: number;
  usableL: number;
  roomL: number;
  massKg: number;
  plusMinusL: number;
  note: string | null;
  recordedBy: string;
  recordedAt: Date;
}

export function defineReading(sequelize: Sequelize): ModelStatic<Model<ReadingRecord>> {
  return sequelize.define<Model<ReadingRecord>>(
    'reading',
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      workshopId: { type: DataTypes.CHAR(36), allowNull: false, field: 'workshop_id' },
      tankId: { type: DataTypes.CHAR(36), allowNull: false, field: 'tank_id' },
      revisionId: { type: DataTypes.CHAR(36), allowNull: false, field: 'revision_id' },
      idempotencyKey: { type: DataTypes.STRING(200), allowNull: false, field: 'idempotency_key' },
      bodyHash: { type: DataTypes.CHAR(64), allowNull: false, field: 'body_hash' },
      takenAt: { type: DataTypes.DATE(3), allowNull: false, field: 'taken_at' },
      depthMm: { type: DataTypes.DOUBLE, allowNull: false, field: 'depth_mm' },
      volumeL: { type: DataTypes.DOUBLE, allowNull: false, field: 'volume_l' },
      usableL: { type: DataTypes.DOUBLE, allowNull: false, field: 'usable_l' },
      roomL: { type: DataTypes.DOUBLE, allowNull: false, field: 'room_l' },
      massKg: { type: DataTypes.DOUBLE, allowNull: false, field: 'mass_kg' },
      plusMinusL: { type: DataTypes.DOUBLE, allowNull: false, field: 'plus_minus_l' },
      note: { type: DataTypes.STRING(500), allowNull: true },
      recordedBy: { type: DataTypes.CHAR(36), allowNull: false, field: 'recorded_by' },
      recordedAt: { type: DataTypes.DATE(3), allowNull: false, field: 'recorded_at' },
    },
    { tableName: 'readings' },
  );
}
