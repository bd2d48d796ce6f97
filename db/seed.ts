import { composeContext } from '../src/server/compose';
import { readConfig } from '../src/server/config';
import { seedDemo } from './seeds/demo';
import { once } from './seeds/once';

/** `node --import tsx db/seed.ts`: puts the demo workshop into the configured database, once. */
try {
  const context = await composeContext(readConfig());
  try {
    const seeded = await once(context, 'demo', seedDemo);
    process.stdout.write(
      seeded ? 'The demo workshop stands.\n' : 'The demo workshop was put in before.\n',
    );
  } finally {
    await context.close();
  }
} catch (error) {
  // the message only: the driver hangs its connection settings, password included, on its errors
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
}
