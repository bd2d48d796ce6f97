import { StartFault } from '../../../db/local/start-fault.mjs';
import { runProgram } from './run-program.mjs';
import { say } from './say.mjs';

/**
 * Brings the tables up to date and, once, puts the demo workshop in.
 * @param {string} checkout
 * @param {Record<string, string>} settings
 */
export async function prepareData(checkout, settings) {
  await runScript(
    checkout,
    settings,
    'db/migrate.ts',
    'Preparing the database tables.',
    'The tables could not be brought up to date',
  );
  await runScript(
    checkout,
    settings,
    'db/seed.ts',
    'Checking the demo workshop.',
    'The demo workshop could not be put in',
  );
}

async function runScript(checkout, settings, script, doing, failing) {
  say(doing);
  const { code, output } = await runProgram(process.execPath, ['--import', 'tsx', script], {
    cwd: checkout,
    env: settings,
  });
  const lines = output
    .split('\n')
    .map((line) => line.trim())
    .filter(Boolean);
  if (code === 0) {
    for (const line of lines) say(`  ${line}`);
    return;
  }
  const full = /ER_RECORD_FILE_FULL|errno: 28|No space left|The table '.*' is full/i.test(output);
  const why = lines.find((line) => !line.startsWith('at '));
  throw full
    ? new StartFault(
        `${failing}: the disk is full.`,
        'Free at least 500 MB, then run the command again. The data is kept.',
      )
    : new StartFault(
        `${failing}${why ? ` (${why.slice(0, 300)})` : ''}.`,
        'Run the command again; what was done before is kept. docs/operations.md says more.',
      );
}
