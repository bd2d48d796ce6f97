import { afterAll, describe, expect, it } from 'vitest';
import type { KeptRow } from '~/domain/table/request';
import { createComputePool } from '~/server/jobs/compute-pool';
import { box, cylinder, design, slopedCistern } from '../../domain/table/designs';

const pool = createComputePool({ threads: 2 });
afterAll(() => pool.close());

const settings = {
  liquid: 'drinking-water',
  densityKgPerM3: null,
  safeFillPercent: 100,
  outletMm: null,
  referenceHeightMm: null,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
} as const;

/** Readings of the rows that were asked for, without those that only look-ups use. */
function askedFor(rows: readonly KeptRow[]): number[] {
  return rows.filter(({ betweenRows }) => !betweenRows).map(({ depthMm }) => depthMm);
}

describe('the compute pool', { timeout: 60_000 }, () => {
  it('computes in a thread while the event loop stays free', async () => {
    let turns = 0;
    const timer = setInterval(() => (turns += 1), 1);
    const many = design(
      Array.from({ length: 6 }, (_, i) =>
        cylinder(`c${i}`, 300, 900, { axis: 'z', at: [200 * i, 0, 0] }),
      ),
    );
    const [table] = await Promise.all([
      pool.table(slopedCistern, { atMm: [30, 60, 150, 300] }),
      pool.table(many, { stepMm: 1 }),
    ]);
    clearInterval(timer);
    expect(table.rows.map(({ volumeL }) => Math.round(volumeL * 1e9) / 1e9)).toEqual([
      4.5, 15, 55.5, 123,
    ]);
    expect(turns).toBeGreaterThan(3);
  });

  it('issues, and refuses as data that keeps code and pointers', async () => {
    const { rows } = await pool.issue(slopedCistern, settings, 50);
    expect(askedFor(rows)).toEqual([0, 50, 100, 150, 200, 250, 300]);
    // the closer row for look-ups stands where the sloped floor ends
    const closer = rows.filter(({ betweenRows }) => betweenRows);
    expect(closer.map(({ depthMm }) => depthMm)).toEqual([60]);
    const apart = design([
      box('a', [100, 100, 100]),
      box('b', [100, 100, 100], { at: [300, 0, 0] }),
    ]);
    await expect(pool.issue(apart, settings, 50)).rejects.toMatchObject({
      name: 'DipwrightError',
      code: 'invalid',
      faults: [{ pointer: '/solids' }],
    });
    await expect(pool.table(slopedCistern, { atMm: [301] })).rejects.toMatchObject({
      faults: [{ pointer: '/atMm/0' }],
    });
  });

  it('sketches sixty balls in a thread: small, soon, while the event loop answers', async () => {
    const balls = design(
      Array.from({ length: 60 }, (_, i) => ({
        id: `ball ${i}`,
        role: 'holds',
        kind: 'sphere',
        diameter: 200,
        at: [160 * (i % 10), 160 * Math.floor(i / 10), 0],
      })),
    );
    let [last, longestMs] = [performance.now(), 0];
    const timer = setInterval(() => {
      longestMs = Math.max(longestMs, performance.now() - last);
      last = performance.now();
    }, 1);
    const start = performance.now();
    const sketch = await pool.sketch(balls);
    const tookMs = performance.now() - start;
    clearInterval(timer);
    expect(sketch.lines.length).toBeGreaterThan(50);
    // lines of a print, not a mesh of a hundred thousand triangles
    expect(JSON.stringify(sketch).length).toBeLessThan(500_000);
    expect(tookMs).toBeLessThan(8000);
    // far under what the work takes; two busy processors alone make some tens of ms
    expect(longestMs).toBeLessThan(500);
    console.log(
      `sketch of 60 balls: ${Math.round(tookMs)} ms, loop held at most ${Math.round(longestMs)} ms`,
    );
  });

  it('says of a sketch that takes too long that it is the sketch', async () => {
    const hasty = createComputePool({ threads: 1, limitSeconds: { table: 0.005 } });
    await expect(hasty.sketch(slopedCistern)).rejects.toMatchObject({
      code: 'unavailable',
      message: expect.stringMatching(/^The sketch was not ready after 0.005 seconds/),
    });
    await hasty.close();
  });

  it('gives up at the time limit, says so, and works on', async () => {
    const hasty = createComputePool({ threads: 1, limitSeconds: { table: 0.005 } });
    await expect(hasty.table(slopedCistern, { stepMm: 1 })).rejects.toMatchObject({
      code: 'unavailable',
      message: expect.stringMatching(/not ready after 0.005 seconds/),
    });
    const { rows } = await hasty.issue(slopedCistern, settings, 100);
    expect(askedFor(rows)).toEqual([0, 100, 200, 300]);
    await hasty.close();
    await expect(hasty.table(slopedCistern, { stepMm: 1 })).rejects.toMatchObject({
      code: 'unavailable',
    });
  });
});
