import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { StartFault } from '../../../db/local/start-fault.mjs';
import { runProgram } from './run-program.mjs';
import { say } from './say.mjs';

const sources = ['src', 'public', 'astro.config.mjs', 'tsconfig.json', 'package.json', 'package-lock.json'];

/**
 * Builds the product, only when a source differs from what was built last.
 * @param {string} checkout
 */
export async function buildProduct(checkout) {
  const stampFile = join(checkout, 'dist', '.dipwright-built');
  const wanted = stampOf(checkout);
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === wanted) return;
  say('Building the product (about a minute, only after a change).');
  const { code, output } = await runProgram(
    process.execPath,
    [join('node_modules', 'astro', 'astro.js'), 'build'],
    { cwd: checkout, env: { NODE_ENV: 'production' } },
  );
  if (code !== 0) throw buildFault(output);
  writeFileSync(stampFile, wanted);
}

/** A hash over every source file's path and content. */
function stampOf(checkout) {
  const hash = createHash('sha256').update(process.version);
  const add = (path) => {
    const full = join(checkout, path);
    const found = statSync(full, { throwIfNoEntry: false });
    if (!found) return;
    if (found.isDirectory()) for (const name of readdirSync(full).sort()) add(join(path, name));
    else hash.update(`\n${path}\n`).update(readFileSync(full));
  };
  sources.forEach(add);
  return hash.digest('hex');
}

function buildFault(output) {
  if (/ENOSPC|no space left/i.test(output)) {
    return new StartFault('The disk is full: the product could not be built.', 'Free at least 1 GB, then run the command again. The data is kept.');
  }
  const lines = output.replace(/\u001b\[[0-9;]*m/g, '').split('\n').map((line) => line.trim());
  const at = lines.findLastIndex((line) => /error/i.test(line));
  const why = lines.slice(Math.max(0, at)).filter((line) => line && !line.startsWith('at ')).slice(0, 3).join(' ');
  return new StartFault(`The product could not be built (${why.slice(0, 400)}).`, 'Run: npx astro build, and mend what it says. Then run the command again.');
}
