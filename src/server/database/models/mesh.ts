import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { MeshUnit } from '~/domain/tank/kinds/mesh/uploaded';

/** `id` is made from `hash`, which is that of what the mesh holds: the same mesh has the same id everywhere. */
export interface MeshRecord {
  workshopId: string;
  id: string;
  hash: string;
  name: string;
  triangles: number;
  bytes: number;
  unit: MeshUnit;
  createdBy: string;
  createdAt: Date;
}

export function defineMesh(sequelize: Sequelize): ModelStatic<Model<MeshRecord>> {
  return sequelize.define<Model<MeshRecord>>(
    'mesh',
    {
      workshopId: { type: DataTypes.CHAR(36), primaryKey: true, field: 'workshop_id' },
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      hash: { type: DataTypes.CHAR(64), allowNull: false },
      name: { type: DataTypes.STRING(120), allowNull: false },
      triangles: { type: DataTypes.INTEGER, allowNull: false },
      bytes: { type: DataTypes.INTEGER, allowNull: false },
      unit: { type: DataTypes.STRING(2), allowNull: false },
      createdBy: { type: DataTypes.CHAR(36), allowNull: false, field: 'created_by' },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, field: 'created_at' },
    },
    { tableName: 'meshes' },
  );
}
