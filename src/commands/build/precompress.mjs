import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { extname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';

const worthIt = new Set(['.css', '.js', '.json', '.mjs', '.svg', '.txt', '.wasm', '.webmanifest']);
const smallestBytes = 1_000;

/** Astro integration: lays a .br and a .gz beside every file of the client that gains by it. */
export function precompress() {
  return {
    name: 'dipwright-precompress',
    hooks: {
      'astro:build:done': async ({ dir }) => {
        for (const file of filesBelow(fileURLToPath(dir))) {
          const bytes = readFileSync(file);
          if (!worthIt.has(extname(file)) || bytes.length < smallestBytes) continue;
          const [br, gz] = await Promise.all([
            promisify(brotliCompress)(bytes, { params: { [constants.BROTLI_PARAM_QUALITY]: 9 } }),
            promisify(gzip)(bytes, { level: 9 }),
          ]);
          if (br.length < bytes.length) writeFileSync(`${file}.br`, br);
          if (gz.length < bytes.length) writeFileSync(`${file}.gz`, gz);
        }
      },
    },
  };
}

function filesBelow(folder) {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) =>
    entry.isDirectory() ? filesBelow(join(folder, entry.name)) : [join(folder, entry.name)],
  );
}
