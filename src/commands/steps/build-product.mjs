import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { withFolderLock } from '../../../db/local/folder-lock.mjs';
import { isFolderUsed, joinFolder } from '../../../db/local/folder-users.mjs';
import { StartFault } from '../../../db/local/start-fault.mjs';
import { runProgram } from './run-program.mjs';
import { say } from './say.mjs';

const sources = [
  'src',
  'public',
  'astro.config.mjs',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
];
const keptBuilds = 2;

/**
 * Builds the product, only when no build of these very sources is there. Each build has a folder of
 * its own, so that a server that runs on an older one keeps its files.
 * @param {string} checkout
 * @returns {Promise<string>} the folder of the build, marked as used by this command
 */
export async function buildProduct(checkout) {
  const dist = join(checkout, 'dist');
  mkdirSync(dist, { recursive: true });
  return withFolderLock(dist, async () => {
    const folder = join(dist, stampOf(checkout).slice(0, 16));
    if (!existsSync(markOf(folder))) {
      say('Building the product (about a minute, only after a change).');
      rmSync(folder, { recursive: true, force: true });
      const { code, output } = await runProgram(
        process.execPath,
        [join('node_modules', 'astro', 'astro.js'), 'build', '--outDir', folder],
        { cwd: checkout, env: { NODE_ENV: 'production' } },
      );
      if (code !== 0) throw buildFault(output);
    }
    // Written anew at each use: the oldest mark is the least needed build.
    writeFileSync(markOf(folder), '');
    joinFolder(folder);
    removeOldBuilds(dist);
    return folder;
  });
}

function markOf(folder) {
  return join(folder, 'built');
}

function removeOldBuilds(dist) {
  const age = (folder) => statSync(markOf(folder), { throwIfNoEntry: false })?.mtimeMs ?? 0;
  readdirSync(dist, { withFileTypes: true })
    .filter((entry) => entry.isDirectory() && /^[0-9a-f]{16}$/.test(entry.name))
    .map((entry) => join(dist, entry.name))
    .sort((a, b) => age(b) - age(a))
    .slice(keptBuilds)
    .filter((folder) => !isFolderUsed(folder))
    .forEach((folder) => rmSync(folder, { recursive: true, force: true }));
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
    return new StartFault(
      'The disk is full: the product could not be built.',
      'Free at least 1 GB, then run the command again. The data is kept.',
    );
  }
  const lines = output
    .replace(/\u001b\[[0-9;]*m/g, '')
    .split('\n')
    .map((line) => line.trim());
  const at = lines.findLastIndex((line) => /error/i.test(line));
  const why = lines
    .slice(Math.max(0, at))
    .filter((line) => line && !line.startsWith('at '))
    .slice(0, 3)
    .join(' ');
  return new StartFault(
    `The product could not be built (${why.slice(0, 400)}).`,
    'Run: npx astro build, and mend what it says. Then run the command again.',
  );
}
