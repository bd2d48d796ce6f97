import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { ComputedTable } from '~/domain/table/request';
import { slopedCistern } from '../domain/table/designs';
import { child, type ChildOutcome } from '../support/strap-child';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'strap-'));
});
afterAll(() => rm(folder, { recursive: true }));

/** The command as a user runs it, in a process of its own. */
async function strap(content: unknown, ...options: string[]): Promise<ChildOutcome> {
  const file = join(folder, 'design.json');
  await writeFile(file, typeof content === 'string' ? content : JSON.stringify(content));
  return run(file, ...options);
}

function run(...args: string[]): Promise<ChildOutcome> {
  return child(process.execPath, '--import', 'tsx', 'src/commands/strap.ts', ...args);
}

describe('the contract of the command', { timeout: 60_000 }, () => {
  it('prints every field, rows from 0 to the top at the step', async () => {
    const { exit, out } = await strap(
      { ...slopedCistern, outlet: [50, 250, 20], vent: [450, 250, 300] },
      '--step',
      '100',
    );
    expect(exit).toBe(0);
    const table = JSON.parse(out) as ComputedTable;
    expect(Object.keys(table)).toEqual([
      'capacityL',
      'heightMm',
      'errorL',
      'triangles',
      'undrainableL',
      'trappedL',
      'rows',
    ]);
    expect(table.rows.map((row) => row.depthMm)).toEqual([0, 100, 200, 300]);
    expect(Object.keys(table.rows[0]!)).toEqual(['depthMm', 'volumeL', 'surfaceCm2', 'centroidMm']);
    expect(table.undrainableL).toBeCloseTo(0.05 * 20 + 400 / 300, 9);
    expect(table.trappedL).toBe(0);
  });

  it('runs by its name and prints CSV', async () => {
    const file = join(folder, 'cistern.json');
    await writeFile(file, JSON.stringify(slopedCistern));
    const { out } = await child(
      'npm',
      'run',
      '--silent',
      'strap',
      '--',
      file,
      '--at',
      '60',
      '--csv',
    );
    expect(
      out
        .split('\n')
        .slice(0, 2)
        .map((line) => line.split(',').slice(0, 3).join(',')),
    ).toEqual(['depthMm,volumeL,surfaceCm2', '60,15,4500']);
  });

  it.each([
    [
      'a size below 0',
      { ...slopedCistern, solids: [{ ...slopedCistern.solids[0], height: -300 }] },
      'Solid "body", height: a length is more than 0 mm.',
    ],
    [
      'a kind that there is none of',
      { ...slopedCistern, solids: [{ ...slopedCistern.solids[0], kind: 'blob' }] },
      /^Solid "body", kind: the kind of a solid is box, cylinder/,
    ],
    [
      'an unknown field',
      { ...slopedCistern, solids: [{ ...slopedCistern.solids[0], hight: 1 }] },
      'Solid "body", hight: there is no such field here.',
    ],
    ['text that is not JSON', '{', /is not JSON/],
  ])('exits 2 with one sentence for %s', async (_, content, sentence) => {
    const { exit, out, err } = await strap(content);
    expect({ exit, out }).toEqual({ exit: 2, out: '' });
    expect(err.trim().split('\n')).toHaveLength(1);
    expect(err.trim()).toMatch(
      sentence instanceof RegExp ? sentence : new RegExp(`^${escaped(sentence)}$`),
    );
  });

  it('exits 2 for a reading outside the stick, 1 for a missing file or a wrong option', async () => {
    expect((await strap(slopedCistern, '--at', '301')).exit).toBe(2);
    const missing = await run(join(folder, 'none.json'));
    expect(missing.exit).toBe(1);
    expect(missing.err.trim()).toMatch(/none\.json cannot be read\.$/);
    for (const options of [['--at', 'ten'], ['--step', '1', '--at', '1'], ['--gallons']]) {
      const { exit, err } = await strap(slopedCistern, ...options);
      expect(exit).toBe(1);
      expect(err.trim().split('\n')).toHaveLength(1);
    }
    expect((await run()).exit).toBe(1);
  });
});

function escaped(text: string): string {
  return text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
}
