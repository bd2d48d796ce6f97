import { runProgram } from '../steps/run-program.mjs';
import { say } from '../steps/say.mjs';

/**
 * A check that is one program with one verdict: it counts as one test.
 * @param {string} checkout
 * @param {string} name
 * @param {string[]} args for Node
 * @returns {Promise<import('./vitest-suite.mjs').SuiteResult>}
 */
export async function programSuite(checkout, name, args, env = {}) {
  const { code } = await runProgram(process.execPath, args, { cwd: checkout, env, show: true });
  if (code === 0) say(`✓ ${name}`);
  return { name, passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, skipped: 0 };
}
