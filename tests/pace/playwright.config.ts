import usual from '../../playwright.config';

/* How quick the bench is in a browser: `node src/commands/test.mjs --only pace`, part of `npm run test:long`. */
export default {
  ...usual,
  testDir: '.',
  testMatch: 'worker-speed.ts',
  outputDir: '../../test-results',
  timeout: 180_000,
};
