import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { Role } from '~/domain/access/roles';

/** A person in a workshop, with one role. */
export interface MembershipRecord {
  workshopId: string;
  userId: string;
  role: Role;
  createdAt: Date;
}

export function defineMembership(sequelize: Sequelize): ModelStatic<Model<MembershipRecord>> {
  return sequelize.define<Model<MembershipRecord>>(
    'membership',
    {
      workshopId: { type: DataTypes.CHAR(36), primaryKey: true, field: 'workshop_id' },
      userId: { type: DataTypes.CHAR(36), primaryKey: true, field: 'user_id' },
      role: { type: DataTypes.STRING(16), allowNull: false },
      createdAt: { type: DataTypes.DATE(3), allowNull: false, field: 'created_at' },
    },
    { tableName: 'memberships' },
  );
}
