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
  const [early, late] = [marks[2]!, marks[9]!];
  // heap and what it holds outside: within 2 MB; resident: within a tenth
  expect(late[0]).toBeLessThan(early[0] + 2);
  expect(late[1]).toBeLessThan(early[1] + 2);
  expect(late[2]).toBeLessThan(1.1 * early[2]);
});
