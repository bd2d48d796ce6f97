import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { LiquidCode } from '~/domain/liquid/liquids';
import type { TankSettings } from '~/domain/tank/settings';

/** A tank with its settings; its shape is in the draft and the revisions. */
export interface TankRecord {
  id: string;
  workshopId: string;
  installationId: string;
  name: string;
  liquid: LiquidCode;
  densityKgPerM3: number | null;
  safeFillPercent: number;
  outletMm: number | null;
  referenceHeightMm: number | null;
  measuredBy: TankSettings['measuredBy'];
  sizePlusMinusMm: number;
  /** ± of single sizes as JSON, null: none has its own. */
  ownSizePlusMinus: string | null;
  dipPlusMinusMm: number;
  createdBy: string;
  createdAt: Date;
}

export function defineTank(sequelize: Sequelize): ModelStatic<Model<TankRecord>> {
  return sequelize.define<Model<TankRecord>>(
    'tank',
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      workshopId: { type: DataTypes.CHAR(36), allowNull: false, field: 'workshop_id' },
      installationId: { type: DataTypes.CHAR(36), allowNull: false, field: 'installation_id' },
      name: { type: DataTypes.STRING(120), allowNull: false },
      liquid: { type: DataTypes.STRING(32), allowNull: false },
      densityKgPerM3: { type: DataTypes.DOUBLE, allowNull: true, field: 'density_kg_per_m3' },
      safeFillPercent: { type: DataTypes.DOUBLE, allowNull: false, field: 'safe_fill_percent' },
      outletMm: { type: DataTypes.DOUBLE, allowNull: true, field: 'outlet_mm' },
      referenceHeightMm: { type: DataTypes.DOUBLE, allowNull: true, field: 'reference_height_mm' },
      measuredBy: { type: DataTypes.STRING(16), allowNull: false, field: 'measured_by' },
      sizePlusMinusMm: { type: DataTypes.DOUBLE, allowNull: false, field: 'size_plus_minus_mm' },
      ownSizePlusMinus: { type: DataTypes.TEXT, allowNull: true, field: 'own_size_plus_minus' },
      dipPlusMinusMm: { type: DataTypes.DOUBLE, allowNull: false, field: 'dip_plus_minus_mm' },
      createdBy: { type: DataTypes.CHAR(36), allowNull: false, field: 'created_by' },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, field: 'created_at' },
    },
    { tableName: 'tanks' },
  );
}
