import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface StrappingRowRecord {
  revisionId: string;
  rowNo: number;
  depthMm: number;
  volumeL: number;
  surfaceCm2: number;
  plusMinusL: number;
  betweenRows: boolean;
}

export function defineStrappingRow(sequelize: Sequelize): ModelStatic<Model<StrappingRowRecord>> {
  return sequelize.define<Model<StrappingRowRecord>>(
    'strapping-row',
    {
      revisionId: { type: DataTypes.CHAR(36), primaryKey: true, field: 'revision_id' },
      rowNo: { type: DataTypes.INTEGER, primaryKey: true, field: 'row_no' },
      depthMm: { type: DataTypes.DOUBLE, allowNull: false, field: 'depth_mm' },
      volumeL: { type: DataTypes.DOUBLE, allowNull: false, field: 'volume_l' },
      surfaceCm2: { type: DataTypes.DOUBLE, allowNull: false, field: 'surface_cm2' },
      plusMinusL: { type: DataTypes.DOUBLE, allowNull: false, field: 'plus_minus_l' },
      betweenRows: {
        type: DataTypes.BOOLEAN,
        allowNull: false,
        defaultValue: false,
        field: 'between_rows',
      },
    },
    { tableName: 'strapping_rows' },
  );
}
