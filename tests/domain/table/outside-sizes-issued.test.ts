import { describe, expect, it } from 'vitest';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computeTable } from '~/domain/table/compute-table';
import { plusMinusOfTable } from '~/domain/table/uncertainty';
import type { Solid } from '~/domain/tank/kinds/registry';
import { box, cylinder, design } from './designs';

const outside = (thickness: number) => ({ wall: { thickness, sizes: 'outside' as const } });

describe('the ± of outside sizes', () => {
  it('counts the wall among the sizes: its own, or a tenth of itself', async () => {
    const tank = design([box('a', [912, 512, 312])], outside(6));
    const table = await computeTable(tank, { stepMm: 300 });
    const brim = async (own: Record<string, number>) =>
      (
        await plusMinusOfTable(
          tank,
          { sizePlusMinusMm: 2, dipPlusMinusMm: 0, ownSizePlusMinusMm: own },
          table,
        )
      ).brimL;
    const exact = { 'a/length': 0, 'a/width': 0, 'a/height': 0 };
    const litres = (t: number) => ((912 - 2 * t) * (512 - 2 * t) * (312 - 2 * t)) / 1e6;
    expect(await brim({ ...exact, 'wall/thickness': 0.25 })).toBeCloseTo(135 - litres(6.25), 6);
    expect(await brim(exact)).toBeCloseTo(135 - litres(6.6), 6);
    // sizes 2 mm larger each, inside: 500 · 300 · 2, 900 · 300 · 2, 900 · 500 · 2 mm³
    expect(await brim({ 'wall/thickness': 0 })).toBeCloseTo(Math.hypot(0.3, 0.54, 0.9), 6);
  });
});

describe('before issue', () => {
  it('splinters beside a round joint are no reason; a film between two walls is', async () => {
    const neck = cylinder('neck', 200, 300, { axis: 'z', at: [400, 150, 300] } as Partial<Solid>);
    for (const wallMm of [2, 6]) {
      const crossed = design([cylinder('body', 500, 1000), neck], outside(wallMm));
      expect(await checkIssuable(crossed), String(wallMm)).toEqual([]);
    }
    const flat = design(
      [cylinder('body', 500, 1000), box('duct', [12.005, 300, 300], { at: [500, 100, 400] })],
      outside(6),
    );
    expect(await checkIssuable(flat)).toEqual([
      expect.stringMatching(/^The liquid space is thinner than 0\.01 mm/),
    ]);
  }, 60_000);
});
