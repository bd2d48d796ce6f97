import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { ComputedTable } from '~/domain/table/request';
import { cylinder, design, hull, slopedCistern } from '../domain/table/designs';

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'strap-'));
});
afterAll(() => rm(folder, { recursive: true }));

interface Outcome {
  exit: number;
  out: string;
  err: string;
}

/** The command as a user runs it, in a process of its own. */
async function strap(content: unknown, ...options: string[]): Promise<Outcome> {
  const file = join(folder, 'design.json');
  await writeFile(file, typeof content === 'string' ? content : JSON.stringify(content));
  return run(file, ...options);
}

function run(...args: string[]): Promise<Outcome> {
  return child(process.execPath, '--import', 'tsx', 'src/commands/strap.ts', ...args);
}

function child(program: string, ...args: string[]): Promise<Outcome> {
  return new Promise((resolve) => {
    execFile(program, args, (error, out, err) => {
      resolve({ exit: error ? Number(error.code) : 0, out, err });
    });
  });
}

async function litresAt(content: unknown, ...depths: number[]): Promise<number[]> {
  const { exit, out, err } = await strap(content, '--at', depths.join(','));
  expect({ exit, err }).toEqual({ exit: 0, err: '' });
  return (JSON.parse(out) as ComputedTable).rows.map(({ volumeL }) => volumeL);
}

describe('worked answers through the command', { timeout: 60_000 }, () => {
  it('sloped water tank: 4.5, 15.0, 55.5 and 123.0 L', async () => {
    // by hand: 0.05 h + h²/300 up to 60 mm, then 15 + 0.45 (h − 60)
    const litres = await litresAt(slopedCistern, 30, 60, 150, 300);
    expect(litres.map((value) => Math.round(value * 1e6) / 1e6)).toEqual([4.5, 15, 55.5, 123]);
    // the same shape seen between the stops of a float, 30 and 270 mm: 4.5 L hidden below, 13.5 L above
    const [low, high, brim] = await litresAt(slopedCistern, 30, 270, 300);
    expect(low).toBeCloseTo(4.5, 6);
    expect(brim! - high!).toBeCloseTo(13.5, 6);
  });

  it('V hull: 0.00072 h² litres', async () => {
    const depths = [40, 250, 353.6, 372.7, 487.3, 500];
    const litres = await litresAt(hull, ...depths);
    depths.forEach((h, i) => expect(litres[i]).toBeCloseTo(0.00072 * h * h, 6));
    expect(litres[0]).toBeCloseTo(1.15, 2);
    expect(litres[1]).toBeCloseTo(45, 6);
    expect(litres[2]).toBeCloseTo(90, 1);
    expect(litres[3]).toBeCloseTo(100, 1);
    expect(litres[4]).toBeCloseTo(171, 1);
    expect(litres[5]).toBeCloseTo(180, 6);
  });

  it('heating oil, lying cylinder 1200 × 2000: 703 L at 16 4/8 in, limit 2194.1 L at 1117 mm', async () => {
    const oil = design([cylinder('tank', 1200, 2000)], { stick: { at: [1000, 600] } });
    const [dip, wrong, limit, reserve, full] = await litresAt(
      oil,
      16.5 * 25.4,
      16.4 * 25.4,
      1117,
      141.6,
      1200,
    );
    expect(Math.abs(dip! - 703.5)).toBeLessThan(0.1);
    expect(Math.abs(wrong! - 697.7)).toBeLessThan(0.1);
    expect(Math.abs(limit! - 2194.1)).toBeLessThan(1);
    expect(Math.abs(reserve! - 150)).toBeLessThan(0.1);
    expect(full).toBeCloseTo(2261.9467, 4);
  });
});

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
