import { execFile } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { describe, expect, it } from 'vitest';

const run = promisify(execFile);
const checkout = fileURLToPath(new URL('../..', import.meta.url));
const pages = ['README.md', 'DEVELOPERS.md', 'docs/index.md', 'docs/architecture.md'];
const textOf = (page: string) => readFileSync(join(checkout, page), 'utf8');
const scripts = (JSON.parse(textOf('package.json')) as { scripts: Record<string, string> }).scripts;

/** The command lines of a page's shell blocks, without their comments. */
function commandsOf(page: string): string[] {
  return [...textOf(page).matchAll(/```sh\n([\s\S]*?)```/g)].flatMap(([, block]) =>
    block!
      .split('\n')
      .map((line) => line.replace(/\s+#.*$/, '').trim())
      .filter(Boolean),
  );
}

describe('what the pages for readers say', () => {
  it.each(pages)('%s names only commands that exist', (page) => {
    const named = commandsOf(page).flatMap((line) =>
      [...line.matchAll(/npm (?:run )?(?:--silent )?([a-z:]+)/g)].map(([, script]) => script!),
    );
    expect(named.filter((script) => scripts[script] === undefined)).toEqual([]);
  });

  it.each(pages)('%s leads only to files that exist', (page) => {
    const links = [...textOf(page).matchAll(/\]\((?!https?:)([^)#]+)/g)].map(([, link]) => link!);
    const missing = links.filter((link) => !existsSync(join(checkout, dirname(page), link)));
    expect(missing).toEqual([]);
  });

  const strap = commandsOf('README.md').filter((line) => line.includes(' strap '));
  it('README shows the strap command', () => expect(strap.length).toBeGreaterThan(0));
  it.each(strap)('%s', { timeout: 60_000 }, async (line) => {
    const [command, ...args] = line.split(/\s+/);
    const { stdout, stderr } = await run(command!, args, { cwd: checkout });
    expect(stderr).toBe('');
    expect(stdout).toContain(line.includes('--csv') ? 'depthMm,volumeL' : '55.5');
  });
});
