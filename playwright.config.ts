import { defineConfig } from '@playwright/test';

/*
 * Browser tests run against the built product: `npm test -- --only browser [file]` builds it, puts
 * the demo into a database of its own, starts it and says where it is.
 */
export default defineConfig({
  testDir: 'tests/e2e',
  testMatch: '**/*.spec.ts',
  outputDir: 'test-results',
  reporter: [['list'], ['json']],
  retries: 0,
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 15_000 },
  use: {
    baseURL: process.env.DIPWRIGHT_TEST_ORIGIN ?? 'http://127.0.0.1:4321',
    screenshot: 'only-on-failure',
    trace: 'off',
    launchOptions: {
      executablePath: process.env.DIPWRIGHT_TEST_CHROMIUM || '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        // WebGL by software: the picture of the bench is drawn without a graphics card.
        '--use-angle=swiftshader',
        '--enable-unsafe-swiftshader',
      ],
    },
  },
});
