import usual from '../../playwright.config';

/* The pictures of README, taken from the running product: `npm run pictures`. */
export default {
  ...usual,
  testDir: '.',
  testMatch: 'take-pictures.ts',
  outputDir: '../../test-results',
};
