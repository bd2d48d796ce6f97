import { ensurePrograms } from '../../db/local/debian-packages.mjs';
import { databasePrograms } from '../../db/local-server.mjs';
import { StartFault } from '../../db/local/start-fault.mjs';
import { checkout } from './steps/checkout.mjs';
import { explainFault, runCommand } from './steps/explain-fault.mjs';
import { installPackages } from './steps/install-packages.mjs';
import { requireNode } from './steps/node-version.mjs';
import { say } from './steps/say.mjs';
import { untilAskedToStop } from './steps/stop-signal.mjs';
import { openTestDatabase } from './steps/test-database.mjs';
import { allSuites } from './suites/all-suites.mjs';
import { sumUp } from './suites/sum-up.mjs';

/*
 * `npm test`: every usual suite. `--only SUITE [arguments for its runner]` runs one, on the packages
 * as they are installed.
 */
await runCommand(async () => {
  const stop = untilAskedToStop();
  requireNode();
  const [flag, only, ...args] = process.argv.slice(2);
  ensurePrograms([...databasePrograms, 'chromium', 'pdftotext', 'pdftoppm'], say);
  if (flag === undefined) await stop.during(installPackages(checkout));
  const server = await openTestDatabase(checkout);
  try {
    const suites = allSuites(checkout, server);
    const wanted =
      flag === '--only'
        ? suites.filter(({ name }) => name === only)
        : suites.filter(({ usual }) => usual);
    if (wanted.length === 0 || (flag !== undefined && flag !== '--only')) {
      throw new StartFault(
        'There is no such suite.',
        `Run npm test alone, or: npm test -- --only ${suites.map(({ name }) => name).join('|')} [file]`,
      );
    }
    const results = [];
    for (const { name, run } of wanted) {
      say(`\n── ${name} ──`);
      results.push(await stop.during(run(args).catch((error) => broken(name, error))));
    }
    const { lines, failed } = sumUp(results);
    say(`\n${lines.join('\n')}`);
    if (failed > 0) process.exitCode = 1;
  } finally {
    await server.stop();
  }
});

/** A suite that could not run at all has failed; the others still run. */
function broken(name, error) {
  const { sentence, nextStep } = explainFault(error);
  say(`${sentence}\n${nextStep}`);
  return { name, passed: 0, failed: 1, skipped: 0, note: 'could not run' };
}
