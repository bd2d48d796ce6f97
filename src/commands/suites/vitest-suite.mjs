import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { runProgram } from '../steps/run-program.mjs';

/** @typedef {{ name: string, passed: number, failed: number, skipped: number, note?: string }} SuiteResult */

/**
 * Runs one vitest project, its own output shown, and counts its tests.
 * @param {string} checkout
 * @param {string} project
 * @param {Record<string, string>} env
 * @param {string[]} [args] files or further arguments
 * @returns {Promise<SuiteResult>}
 */
export async function vitestSuite(checkout, project, env, args = []) {
  const folder = mkdtempSync(join(tmpdir(), 'dipwright-vitest-'));
  const file = join(folder, 'result.json');
  const { code } = await runProgram(
    process.execPath,
    [
      join(checkout, 'node_modules', 'vitest', 'vitest.mjs'),
      'run',
      `--project=${project}`,
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${file}`,
      ...args,
    ],
    { cwd: checkout, env: { NODE_ENV: 'test', ...env }, show: true },
  );
  const result = countTests(file, project, code);
  rmSync(folder, { recursive: true, force: true });
  return result;
}

function countTests(file, project, code) {
  let report;
  try {
    report = JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return {
      name: project,
      passed: 0,
      failed: 1,
      skipped: 0,
      note: 'vitest ended without a report',
    };
  }
  const brokenFiles = report.testResults.filter(
    (result) =>
      result.status === 'failed' &&
      result.assertionResults.every((test) => test.status !== 'failed'),
  ).length;
  const failed = report.numFailedTests + brokenFiles;
  return {
    name: project,
    passed: report.numPassedTests,
    // An error outside every test fails the run too.
    failed: failed === 0 && code !== 0 ? 1 : failed,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}
