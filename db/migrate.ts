import { readConfig } from '../src/server/config';
import { connect } from '../src/server/database/connect';
import { runMigrations } from './run-migrations';

/** `node --import tsx db/migrate.ts`: brings the tables of the configured database up to date. */
try {
  const { database: address } = readConfig();
  const database = connect(address, { poolSize: 1 });
  try {
    const { applied, warning } = await runMigrations(database.sequelize);
    process.stdout.write(
      applied.length === 0 ? 'The tables are up to date.\n' : `Applied: ${applied.join(', ')}.\n`,
    );
    if (warning !== null) process.stdout.write(`${warning}\n`);
  } finally {
    await database.close();
  }
} catch (error) {
  // the message only: the driver hangs its connection settings, password included, on its errors
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
}
