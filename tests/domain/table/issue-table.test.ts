import { describe, expect, it } from 'vitest';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computeTable } from '~/domain/table/compute-table';
import { issueTable } from '~/domain/table/issue-table';
import { printedRows } from '~/domain/table/printed-rows';
import type { Solid } from '~/domain/tank/kinds/registry';
import type { TankSettings } from '~/domain/tank/settings';
import { startingPoints } from '~/domain/tank/starting-points';
import { box, cylinder, design, hull, slopedCistern } from './designs';

const settings: TankSettings = {
  liquid: 'drinking-water',
  densityKgPerM3: null,
  safeFillPercent: 100,
  outletMm: null,
  referenceHeightMm: null,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
};

describe('what may not be issued', () => {
  it.each(startingPoints.map(({ label, design: tank }) => [label, tank] as const))(
    'not this: %s',
    async (_, tank) => {
      expect(await checkIssuable(tank)).toEqual([]);
    },
  );

  it('a space in pieces, told from one that only looks so', async () => {
    const body = box('body', [900, 500, 300]);
    const apart = await checkIssuable(
      design([body, box('b', [100, 100, 100], { at: [1000, 0, 0] })]),
    );
    expect(apart).toEqual([expect.stringMatching(/^The liquid space is in 2 pieces/)]);
    expect(
      await checkIssuable(design([body, box('b', [100, 100, 100], { at: [900, 0, 0] })])),
    ).toEqual([]);
    // only an edge in common
    expect(
      await checkIssuable(design([body, box('b', [100, 100, 100], { at: [900, 500, 0] })])),
    ).toHaveLength(1);
  });

  it('a wall, a gap or a film thinner than 0.01 mm, with the place', async () => {
    const body = box('body', [900, 500, 300]);
    const gap = await checkIssuable(
      design([body, box('b', [100, 100, 100], { at: [900.004, 0, 0] })]),
    );
    expect(
      gap.some((reason) =>
        /What parts the liquid space is thinner than 0.01 mm near x 900, /.test(reason),
      ),
    ).toBe(true);
    const film = design([
      body,
      box('pump', [100, 100, 299.995], { role: 'displaces', at: [400, 200, 0] }),
    ]);
    expect(await checkIssuable(film)).toEqual([
      expect.stringMatching(
        /^The liquid space is thinner than 0.01 mm near x \d+(\.\d)?, y \d+(\.\d)?, z (300|299.9|300.0)/,
      ),
    ]);
    const clear = design([
      body,
      box('pump', [100, 100, 299.9], { role: 'displaces', at: [400, 200, 0] }),
    ]);
    expect(await checkIssuable(clear)).toEqual([]);
  });

  it('round solids that only touch along a line', async () => {
    const lying = cylinder('c', 400, 1000);
    const touching = design([lying, box('trunk', [200, 400, 100], { at: [400, 0, 400] })]);
    expect((await checkIssuable(touching)).length).toBeGreaterThan(0);
    const joined = design([lying, box('trunk', [200, 400, 100], { at: [400, 0, 390] })]);
    expect(await checkIssuable(joined)).toEqual([]);
  });

  it('an empty space is refused before that', async () => {
    const empty = design([box('body', [9, 9, 9]), box('all', [9, 9, 9], { role: 'displaces' })]);
    await expect(issueTable(empty, settings, 10)).rejects.toMatchObject({ code: 'invalid' });
  });

  it('is refused with one fault a reason', async () => {
    const apart = design([
      box('a', [100, 100, 100]),
      box('b', [100, 100, 100], { at: [100.005, 0, 0] }),
    ]);
    await expect(issueTable(apart, settings, 10)).rejects.toMatchObject({
      code: 'invalid',
      faults: [{ pointer: '/solids' }, { pointer: '/solids' }],
    });
  });
});

describe('the ± of a row', () => {
  const rowAt = async (
    tank: Parameters<typeof issueTable>[0],
    depth: number,
    change: Partial<TankSettings> = {},
  ) => {
    const { rows } = await issueTable(tank, { ...settings, ...change }, 10);
    return rows.find(({ depthMm }) => depthMm === depth)!;
  };

  it('of a plain box: length, width and dip in quadrature, the height not felt', async () => {
    const tank = design([box('body', [900, 500, 300])], { stick: { at: [50, 250] } });
    const { plusMinusL } = await rowAt(tank, 150);
    const byLength = (2 * 500 * 150) / 1e6;
    const byWidth = (900 * 2 * 150) / 1e6;
    const byDip = (900 * 500 * 2) / 1e6;
    expect(plusMinusL).toBeCloseTo(Math.hypot(byLength, byWidth, byDip), 6);
  });

  it('is 0.9 L by the dip alone on straight sides of 0.45 L/mm', async () => {
    // the figure for a dipstick read to ± 2 mm on 0.45 L/mm
    expect((await rowAt(slopedCistern, 150, { sizePlusMinusMm: 0 })).plusMinusL).toBeCloseTo(
      0.9,
      6,
    );
  });

  describe('of 2 ± 0.1 by 2 ± 0.2 by 2 ± 0.3', () => {
    // worked example, mathematics forum question 4614762: V = 8, ΔV = 0.4 √14 = 1.49666, and not
    // 2.626, which is the greatest volume less V. The rule is JCGM 100:2008, 5.1.2, equation (10). Here in cm
    const cube = design([box('cube', [20, 20, 20])], { stick: { at: [10, 10] } });
    const own = { 'cube/length': 1, 'cube/width': 2, 'cube/height': 3 };

    it('the brim is ± 1.49666, without a dip', async () => {
      for (const dipPlusMinusMm of [0, 2]) {
        const measured = { ...settings, ownSizePlusMinusMm: own, dipPlusMinusMm };
        const { brimPlusMinusL, table } = await issueTable(cube, measured, 5);
        expect(table.capacityL * 1000).toBeCloseTo(8, 9);
        expect(brimPlusMinusL * 1000).toBeCloseTo(0.4 * Math.sqrt(14), 6);
        expect(brimPlusMinusL * 1000).toBeLessThan(2.626);
      }
    });

    it('a reading at the top does not feel the height, and feels the dip', async () => {
      const sizes = Math.hypot(0.1 * 4, 0.2 * 4);
      const bySizes = await rowAt(cube, 20, { ownSizePlusMinusMm: own, dipPlusMinusMm: 0 });
      expect(bySizes.plusMinusL * 1000).toBeCloseTo(sizes, 6);
      const withDip = await rowAt(cube, 20, { ownSizePlusMinusMm: own, dipPlusMinusMm: 1 });
      expect(withDip.plusMinusL * 1000).toBeCloseTo(Math.hypot(sizes, 0.1 * 4), 6);
    });

    it('sizes without a ± of their own have that of all; keys of what is gone do not matter', async () => {
      const some = { 'cube/height': 3, 'gone/length': 50, 'cube/diameter': 50 };
      const measured = { ...settings, sizePlusMinusMm: 2, ownSizePlusMinusMm: some };
      const { brimPlusMinusL } = await issueTable(cube, measured, 5);
      expect(brimPlusMinusL * 1000).toBeCloseTo(Math.hypot(0.2 * 4, 0.2 * 4, 0.3 * 4), 6);
    });

    it('a size that is exact adds nothing', async () => {
      const measured = {
        ...settings,
        ownSizePlusMinusMm: { ...own, 'cube/width': 0, 'cube/height': 0 },
      };
      const { brimPlusMinusL } = await issueTable(cube, measured, 5);
      expect(brimPlusMinusL * 1000).toBeCloseTo(0.1 * 4, 6);
    });
  });

  it('of the brim of a ball is that of its diameter', async () => {
    const ball = design([{ id: 'ball', role: 'holds', kind: 'sphere', diameter: 600 } as Solid]);
    const { brimPlusMinusL } = await issueTable(ball, settings, 50);
    // dV = π D²/2 · dD
    expect(brimPlusMinusL / ((Math.PI * 600 * 600 * 2) / 2e6)).toBeCloseTo(1, 2);
  });

  it('of a lying cylinder: dV/dD by its closed form', async () => {
    const tank = design([cylinder('c', 600, 1000)], { stick: { at: [500, 300] } });
    const { plusMinusL } = await rowAt(tank, 300, { dipPlusMinusMm: 0 });
    const segment = (d: number, h: number) => {
      const r = d / 2;
      return r * r * Math.acos((r - h) / r) - (r - h) * Math.sqrt(2 * r * h - h * h);
    };
    const byDiameter = ((segment(602, 300) - segment(600, 300)) * 1000) / 1e6;
    const byLength = (segment(600, 300) * 2) / 1e6;
    expect(plusMinusL / Math.hypot(byDiameter, byLength)).toBeCloseTo(1, 3);
  });

  it('does not hide a size of a turned solid that meets another', async () => {
    // each half width ± 2 mm of the hull: at 250 mm, 45 L, about 45/2 · 2/300 each
    const { plusMinusL } = await rowAt(hull, 250, { dipPlusMinusMm: 0 });
    const eachHalf = (22.5 * 2) / 300;
    expect(plusMinusL).toBeGreaterThan(Math.hypot(eachHalf, eachHalf));
    expect(plusMinusL).toBeLessThan(2);
  });

  it('keeps the rows of the computed table', async () => {
    const { table, rows } = await issueTable(slopedCistern, settings, 50);
    expect(printedRows(rows)).toEqual(
      table.rows.map(({ depthMm, volumeL, surfaceCm2 }) => ({
        depthMm,
        volumeL,
        surfaceCm2,
        plusMinusL: rows.find((row) => row.depthMm === depthMm)!.plusMinusL,
      })),
    );
    expect((await computeTable(slopedCistern, { stepMm: 50 })).rows).toEqual(table.rows);
    // one closer row, where the slope of the floor ends
    expect(rows.filter(({ betweenRows }) => betweenRows).map(({ depthMm }) => depthMm)).toEqual([
      60,
    ]);
    for (const { plusMinusL } of rows) expect(plusMinusL).toBeGreaterThan(0);
  });
});
