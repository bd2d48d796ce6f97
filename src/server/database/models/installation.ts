import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { Installation } from '~/domain/installation/installation';

export interface InstallationRecord {
  id: string;
  workshopId: string;
  name: string;
  kind: Installation['kind'];
  createdBy: string;
  createdAt: Date;
}

export function defineInstallation(sequelize: Sequelize): ModelStatic<Model<InstallationRecord>> {
  return sequelize.define<Model<InstallationRecord>>(
    'installation',
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      workshopId: { type: DataTypes.CHAR(36), allowNull: false, field: 'workshop_id' },
      name: { type: DataTypes.STRING(120), allowNull: false },
      kind: { type: DataTypes.STRING(16), allowNull: false },
      createdBy: { type: DataTypes.CHAR(36), allowNull: false, field: 'created_by' },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, field: 'created_at' },
    },
    { tableName: 'installations' },
  );
}
