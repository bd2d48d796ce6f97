import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const alias = { '~': fileURLToPath(new URL('./src', import.meta.url)) };
const typeScript = '*.test.{ts,tsx}';

/*
 * One project a kind of test. `server` needs the test database: run it through
 * `node src/commands/test.mjs --only server [file]`, which starts one and says where it is.
 */
export default defineConfig({
  resolve: { alias },
  test: {
    maxWorkers: 2,
    projects: [
      {
        extends: true,
        test: {
          name: 'structure',
          include: [`tests/structure/**/${typeScript}`],
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'unit',
          include: [`tests/{geometry,domain,scene,viewport,workers,commands}/**/${typeScript}`],
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'dom',
          include: [`tests/islands/**/${typeScript}`],
          environment: 'happy-dom',
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'server',
          include: [`tests/{server,db}/**/${typeScript}`],
          testTimeout: 60_000,
          hookTimeout: 60_000,
          pool: 'forks',
        },
      },
      {
        extends: true,
        test: {
          name: 'long',
          include: [`tests/long/**/${typeScript}`],
          testTimeout: 300_000,
          hookTimeout: 120_000,
          pool: 'forks',
          fileParallelism: false,
        },
      },
    ],
  },
});
