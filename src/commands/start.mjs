import { ensurePrograms } from '../../db/local/debian-packages.mjs';
import { databasePrograms, openLocalServer } from '../../db/local-server.mjs';
import { StartFault } from '../../db/local/start-fault.mjs';
import { buildProduct } from './steps/build-product.mjs';
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
import { startWebServer } from './steps/web-server.mjs';

/* `npm start`: from a fresh clone to a product that answers. */
await runCommand(async () => {
  const stop = untilAskedToStop();
  requireNode();
  const address = webAddress();
  await requireWebPort(address, 'npm start');
  ensurePrograms(databasePrograms, say);
  await stop.during(installPackages(checkout));
  const database = await openLocalServer({ checkout, name: 'demo', database: 'dipwright', say });
  try {
    const settings = localSettings(database);
    await stop.during(prepareData(checkout, settings));
    const build = await stop.during(buildProduct(checkout));
    const web = await startWebServer(checkout, build, settings);
    say(
      `\nDipwright answers on ${address.origin}\n\n${demoSignIns}\n\nStop with Ctrl-C; all data is kept.`,
    );

    const guard = guardDatabase(database);
    const why = await Promise.race([stop.asked, web.ended.then((end) => ({ end })), guard.lost]);
    guard.end();
    if (why.end) {
      throw new StartFault(
        `The web server stopped unexpectedly (${why.end.signal ?? `code ${why.end.code}`}).`,
        'Run npm start again; all data is kept.',
      );
    }
    say(why.lost ? '\nStopping.' : '\nStopping: requests under way may finish.');
    await web.stop();
    if (why.lost) throw why.lost;
  } finally {
    await database.stop();
  }
  say('Stopped. All data is kept.');
});
