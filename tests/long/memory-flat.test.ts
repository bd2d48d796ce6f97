import { fork } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { expect, it } from 'vitest';

/** Meshes of the library are WebAssembly memory: what is not deleted there is never freed. */
it('memory stays flat over a thousand rebuilds', { timeout: 900_000 }, async () => {
  const file = fileURLToPath(new URL('../support/rebuild-child.mjs', import.meta.url));
  const child = fork(file, { execArgv: ['--import', 'tsx', '--expose-gc'] });
  const marks = await new Promise<[number, number, number][]>((resolve, reject) => {
    child.once('message', (message) => resolve(message as [number, number, number][]));
    child.once('exit', (code) => code !== 0 && reject(new Error(`ended with ${code}`)));
  });
  const told = marks.map((mark) => mark.join(' / ')).join(', ');
  console.log(`heap / external / resident MB after every hundred: ${told}`);
  const most = (part: number, from: number, to: number) =>
    Math.max(...marks.slice(from, to).map((mark) => mark[part]!));
  // heap and what it holds outside within 3 MB, resident within a tenth: the second half against the first
  expect(most(0, 5, 10)).toBeLessThan(most(0, 0, 5) + 3);
  expect(most(1, 5, 10)).toBeLessThan(most(1, 0, 5) + 3);
  expect(most(2, 5, 10)).toBeLessThan(1.1 * most(2, 0, 5));
});
