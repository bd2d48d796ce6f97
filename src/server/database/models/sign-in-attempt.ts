import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** Failed sign-ins of one address, kept by its hash whether or not it has an account. */
export interface SignInAttemptRecord {
  accountHash: string;
  failures: number;
  lastAt: Date;
  blockedUntil: Date;
}

export function defineSignInAttempt(sequelize: Sequelize): ModelStatic<Model<SignInAttemptRecord>> {
  return sequelize.define<Model<SignInAttemptRecord>>(
    'sign-in-attempt',
    {
      accountHash: { type: DataTypes.CHAR(64), primaryKey: true, field: 'account_hash' },
      failures: { type: DataTypes.INTEGER, allowNull: false },
      lastAt: { type: DataTypes.DATE(3), allowNull: false, field: 'last_at' },
      blockedUntil: { type: DataTypes.DATE(3), allowNull: false, field: 'blocked_until' },
    },
    { tableName: 'sign_in_attempts' },
  );
}
