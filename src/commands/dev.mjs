import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { ensurePrograms } from '../../db/local/debian-packages.mjs';
import { databasePrograms, openLocalServer } from '../../db/local-server.mjs';
import { checkout } from './steps/checkout.mjs';
import { demoSignIns } from './steps/demo-sign-ins.mjs';
import { runCommand } from './steps/explain-fault.mjs';
import { guardDatabase } from './steps/guard-database.mjs';
import { installPackages } from './steps/install-packages.mjs';
import { localSettings, webAddress } from './steps/local-settings.mjs';
import { requireNode } from './steps/node-version.mjs';
import { prepareData } from './steps/prepare-data.mjs';
import { requireWebPort } from './steps/require-web-port.mjs';
import { say } from './steps/say.mjs';
import { untilAskedToStop } from './steps/stop-signal.mjs';

/* `npm run dev`: the demo's database with pages that follow each change of a source. */
await runCommand(async () => {
  const stop = untilAskedToStop();
  requireNode();
  const address = webAddress();
  await requireWebPort(address, 'npm run dev');
  ensurePrograms(databasePrograms, say);
  await stop.during(installPackages(checkout));
  const database = await openLocalServer({ checkout, name: 'demo', database: 'dipwright', say });
  try {
    const settings = { ...localSettings(database), DIPWRIGHT_MODE: 'development' };
    await stop.during(prepareData(checkout, settings));
    say(`\nStarting on ${address.origin}\n\n${demoSignIns}\n`);
    const child = spawn(
      process.execPath,
      [
        join('node_modules', 'astro', 'astro.js'),
        'dev',
        '--host',
        address.host,
        '--port',
        String(address.port),
      ],
      {
        cwd: checkout,
        env: {
          ...process.env,
          ASTRO_TELEMETRY_DISABLED: '1',
          ASTRO_DISABLE_UPDATE_CHECK: 'true',
          ...settings,
        },
        stdio: ['ignore', 'inherit', 'inherit'],
      },
    );
    const ended = new Promise((resolve) => child.once('exit', resolve));
    const guard = guardDatabase(database);
    const why = await Promise.race([stop.asked, ended.then(() => ({})), guard.lost]);
    guard.end();
    child.kill('SIGTERM');
    await ended;
    if (why.lost) throw why.lost;
  } finally {
    await database.stop();
  }
});
