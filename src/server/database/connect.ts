import { Sequelize } from 'sequelize';
import { defineModels, type Models } from './models/define';

/** Where the database is. */
export interface DatabaseAddress {
  host: string;
  port: number;
  name: string;
  user: string;
  password: string;
}

/** The connection and the models bound to it. Nothing is connected before the first query. */
export interface Database {
  sequelize: Sequelize;
  models: Models;
  close(): Promise<void>;
}

export function connect(address: DatabaseAddress, options: { poolSize?: number } = {}): Database {
  const sequelize = new Sequelize(address.name, address.user, address.password, {
    dialect: 'mariadb',
    host: address.host,
    port: address.port,
    logging: false,
    timezone: '+00:00',
    dialectOptions: { connectTimeout: 5_000, autoJsonMap: false },
    define: { timestamps: false, freezeTableName: true },
    pool: { max: options.poolSize ?? 10, min: 0, acquire: 10_000, idle: 30_000 },
  });
  return { sequelize, models: defineModels(sequelize), close: () => sequelize.close() };
}
