import { checkout } from './steps/checkout.mjs';
import { runCommand } from './steps/explain-fault.mjs';
import { requireNode } from './steps/node-version.mjs';
import { openTestDatabase, testDatabaseEnvironment } from './steps/test-database.mjs';
import { vitestSuite } from './suites/vitest-suite.mjs';

await runCommand(async () => {
  requireNode();
  const [flag, suite, ...args] = process.argv.slice(2);
  if (flag !== '--only') throw new Error('only --only yet');
  const server = await openTestDatabase(checkout);
  try {
    const result = await vitestSuite(checkout, suite, testDatabaseEnvironment(server), args);
    if (result.failed > 0 || result.passed === 0) process.exitCode = 1;
  } finally {
    await server.stop();
  }
});
