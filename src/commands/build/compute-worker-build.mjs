import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';

/** The server's compute worker is a file of its own: a thread starts from a file, not from a chunk. */
export const computeWorkerSource = 'src/server/jobs/compute-worker.ts';

/**
 * Bundles the compute worker, packages left outside.
 * @param {string} checkout
 * @param {string} outfile
 */
export async function bundleComputeWorker(checkout, outfile) {
  await build({
    absWorkingDir: checkout,
    entryPoints: [computeWorkerSource],
    outfile,
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external',
    sourcemap: true,
    logLevel: 'error',
  });
}

/** Astro integration: the worker is built beside the server when the product is built. */
export function computeWorkerBuild() {
  let root = '';
  let server = '';
  return {
    name: 'dipwright-compute-worker',
    hooks: {
      'astro:config:done': ({ config }) => {
        root = fileURLToPath(config.root);
        server = fileURLToPath(config.build.server);
      },
      'astro:build:done': () => bundleComputeWorker(root, `${server}/compute-worker.mjs`),
    },
  };
}
