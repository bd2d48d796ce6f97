import { join } from 'node:path';
import { buildProduct } from '../steps/build-product.mjs';
import { testDatabaseEnvironment } from '../steps/test-database.mjs';
import { browserSuite } from './browser-suite.mjs';
import { programSuite } from './program-suite.mjs';
import { vitestSuite } from './vitest-suite.mjs';

/**
 * Every suite by its name, in the order of a full run: the quick verdicts first. `usual: false`
 * runs only when it is asked for.
 * @param {string} checkout
 * @param {Awaited<ReturnType<typeof import('../steps/test-database.mjs').openTestDatabase>>} server
 */
export function allSuites(checkout, server) {
  const tool = (...parts) => join('node_modules', ...parts);
  const vitest = (project) => (args) =>
    vitestSuite(checkout, project, testDatabaseEnvironment(server), args);
  const program =
    (name, ...args) =>
    () =>
      programSuite(checkout, name, args);
  const browser = (folder) => (args) =>
    browserSuite(checkout, server, [
      '--config',
      join('tests', folder, 'playwright.config.ts'),
      ...args,
    ]);
  return [
    { name: 'structure', usual: true, run: vitest('structure') },
    {
      name: 'lint',
      usual: true,
      run: program('lint', tool('eslint', 'bin', 'eslint.js'), '--max-warnings=0', '.'),
    },
    { name: 'pages', usual: true, run: program('pages', tool('astro', 'astro.js'), 'check') },
    {
      name: 'types',
      usual: true,
      run: program('types', tool('typescript', 'bin', 'tsc'), '--noEmit'),
    },
    { name: 'unit', usual: true, run: vitest('unit') },
    { name: 'dom', usual: true, run: vitest('dom') },
    { name: 'server', usual: true, run: vitest('server') },
    { name: 'browser', usual: true, run: (args) => browserSuite(checkout, server, args) },
    { name: 'pictures', usual: false, run: browser('pictures') },
    { name: 'pace', usual: false, run: browser('pace') },
    {
      name: 'long',
      usual: false,
      run: async (args) => {
        const build = await buildProduct(checkout);
        return vitestSuite(
          checkout,
          'long',
          { ...testDatabaseEnvironment(server), DIPWRIGHT_TEST_BUILD: build },
          args,
        );
      },
    },
  ];
}
