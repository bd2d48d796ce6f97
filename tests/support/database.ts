import { randomBytes } from 'node:crypto';
import { QueryTypes, Sequelize } from 'sequelize';
import { connect, type Database, type DatabaseAddress } from '~/server/database/connect';
import { runMigrations } from '../../db/run-migrations';

/** An empty, migrated database of its own on the tests' MariaDB. */
export interface FreshDatabase {
  database: Database;
  address: DatabaseAddress;
  /** A statement as it stands, past the models. */
  sql<Row extends object>(statement: string, values?: readonly unknown[]): Promise<Row[]>;
  drop(): Promise<void>;
}

/** `migrate: false` leaves it empty, for tests of the migrations themselves. */
export async function freshDatabase(options: { migrate?: boolean } = {}): Promise<FreshDatabase> {
  const server = testServer();
  const name = `${server.prefix}_${process.pid}_${randomBytes(4).toString('hex')}`;
  await onServer(
    server,
    `CREATE DATABASE ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`,
  );
  const address = {
    host: server.host,
    port: server.port,
    user: server.user,
    password: server.password,
    name,
  };
  const database = connect(address, { poolSize: 12 });
  if (options.migrate !== false) await runMigrations(database.sequelize);
  return {
    database,
    address,
    sql: (statement, values = []) =>
      database.sequelize.query(statement, { replacements: [...values], type: QueryTypes.SELECT }),
    async drop() {
      await database.close();
      await onServer(server, `DROP DATABASE ${name}`);
    },
  };
}

interface TestServer {
  host: string;
  port: number;
  user: string;
  password: string;
  prefix: string;
}

function testServer(): TestServer {
  const setting = (name: string): string => {
    const value = process.env[`DIPWRIGHT_TEST_DATABASE_${name}`];
    if (value === undefined || value === '') {
      throw new Error(
        'No test database: run `node src/commands/test.mjs --only server`, which starts one.',
      );
    }
    return value;
  };
  return {
    host: setting('HOST'),
    port: Number(setting('PORT')),
    user: setting('USER'),
    password: setting('PASSWORD'),
    prefix: setting('PREFIX'),
  };
}

async function onServer(server: TestServer, statement: string): Promise<void> {
  const connection = new Sequelize('', server.user, server.password, {
    dialect: 'mariadb',
    host: server.host,
    port: server.port,
    logging: false,
    pool: { max: 1 },
  });
  try {
    await connection.query(statement);
  } finally {
    await connection.close();
  }
}
