import { fileURLToPath } from 'node:url';

const source = fileURLToPath(new URL('../../server/entry.ts', import.meta.url));

/**
 * Vite plugin: adds our own Node entry to Astro's server build, as dist/server/dipwright.mjs. It
 * goes through the same build as the pages so that both share one copy of every module: an error
 * class or a model has one identity in the process (docs/decisions/0200).
 */
export function serverEntryPlugin() {
  let isServerBuild = false;
  return {
    name: 'dipwright-server-entry',
    apply: 'build',
    configResolved(config) {
      isServerBuild = Boolean(config.build.ssr);
    },
    buildStart() {
      if (!isServerBuild) return;
      this.emitFile({
        type: 'chunk',
        id: source,
        fileName: 'dipwright.mjs',
        preserveSignature: 'strict',
      });
    },
  };
}
