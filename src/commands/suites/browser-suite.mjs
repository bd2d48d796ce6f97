import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { anyFreePort } from '../../../db/local/free-port.mjs';
import { findProgram } from '../../../db/local/debian-packages.mjs';
import { buildProduct } from '../steps/build-product.mjs';
import { localSettings } from '../steps/local-settings.mjs';
import { prepareData } from '../steps/prepare-data.mjs';
import { runProgram } from '../steps/run-program.mjs';
import { startWebServer } from '../steps/web-server.mjs';
import { dropDatabase, makeDatabase } from './scratch-database.mjs';

/**
 * Browser tests against the built product, with the demo workshop in a database of this run's own.
 * @param {string} checkout
 * @param {Awaited<ReturnType<typeof import('../steps/test-database.mjs').openTestDatabase>>} server
 * @param {string[]} [args] for Playwright
 * @returns {Promise<import('./vitest-suite.mjs').SuiteResult>}
 */
export async function browserSuite(checkout, server, args = []) {
  const build = await buildProduct(checkout);
  const database = `dipwright_test_browser_${process.pid}`;
  const port = await anyFreePort();
  const settings = {
    ...localSettings({ ...server, database }),
    DIPWRIGHT_MODE: 'test',
    DIPWRIGHT_HOST: '127.0.0.1',
    DIPWRIGHT_PORT: String(port),
    DIPWRIGHT_ORIGIN: `http://127.0.0.1:${port}`,
  };
  const folder = mkdtempSync(join(tmpdir(), 'dipwright-browser-'));
  makeDatabase(server, database);
  let web;
  try {
    await prepareData(checkout, settings);
    web = await startWebServer(checkout, build, settings);
    const file = join(folder, 'result.json');
    const { code } = await runProgram(
      process.execPath,
      [join(checkout, 'node_modules', '@playwright', 'test', 'cli.js'), 'test', ...args],
      {
        cwd: checkout,
        env: {
          ...settings,
          DIPWRIGHT_TEST_ORIGIN: settings.DIPWRIGHT_ORIGIN,
          DIPWRIGHT_TEST_CHROMIUM: findProgram('chromium') ?? '',
          PLAYWRIGHT_JSON_OUTPUT_NAME: file,
        },
        show: true,
      },
    );
    return countTests(file, code);
  } finally {
    await web?.stop();
    dropDatabase(server, database);
    rmSync(folder, { recursive: true, force: true });
  }
}

function countTests(file, code) {
  let stats;
  try {
    ({ stats } = JSON.parse(readFileSync(file, 'utf8')));
  } catch {
    return {
      name: 'browser',
      passed: 0,
      failed: 1,
      skipped: 0,
      note: 'Playwright ended without a report',
    };
  }
  // A test that passes only when it is run again is not trusted.
  const failed = stats.unexpected + stats.flaky;
  return {
    name: 'browser',
    passed: stats.expected,
    failed: failed === 0 && code !== 0 ? 1 : failed,
    skipped: stats.skipped,
  };
}
