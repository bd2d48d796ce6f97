import { fileURLToPath } from 'node:url';
import node from '@astrojs/node';
import react from '@astrojs/react';
import tailwindcss from '@tailwindcss/vite';
import { defineConfig, passthroughImageService } from 'astro/config';
import { computeWorkerBuild } from './src/commands/build/compute-worker-build.mjs';
import { precompress } from './src/commands/build/precompress.mjs';
import { schemasWithoutEval } from './src/commands/build/schemas-without-eval.mjs';
import { serverEntryPlugin } from './src/commands/build/server-entry-plugin.mjs';

// docs/decisions/0200 and 0201 say why our own entry stands in front and how the CSP is made.
export default defineConfig({
  output: 'server',
  // npm start and npm test give each build a folder of its own beside this one.
  outDir: './dist/by-hand',
  adapter: node({ mode: 'middleware' }),
  integrations: [react(), schemasWithoutEval(), computeWorkerBuild(), precompress()],
  security: {
    // server/http judges Origin and Sec-Fetch-Site for every kind of body. This check knows only
    // 127.0.0.1 and localhost, and would refuse a DELETE under any other name.
    checkOrigin: false,
    allowedDomains: [{ hostname: '127.0.0.1' }, { hostname: 'localhost' }],
  },
  image: { service: passthroughImageService() },
  // The product keeps its sessions itself; Astro's own are never asked for.
  session: { driver: 'memory' },
  build: { inlineStylesheets: 'never' },
  devToolbar: { enabled: false },
  experimental: {
    csp: {
      algorithm: 'SHA-256',
      scriptDirective: { resources: ["'self'", "'wasm-unsafe-eval'"] },
      styleDirective: { resources: ["'self'"] },
    },
  },
  vite: {
    // Astro reads `~` from tsconfig.json for pages; browser workers are bundled without it.
    resolve: { alias: { '~': fileURLToPath(new URL('./src', import.meta.url)) } },
    plugins: [tailwindcss(), serverEntryPlugin()],
    build: { assetsInlineLimit: 0 },
    worker: { format: 'es' },
    optimizeDeps: { exclude: ['manifold-3d'] },
  },
});
