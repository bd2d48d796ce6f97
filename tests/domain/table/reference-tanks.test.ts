import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import { referenceTanks } from './reference-designs';

describe('reference tanks, within 1e-7 of capacity', () => {
  it.each(referenceTanks)('$name', async ({ tank, capacityL, heightMm, rows }) => {
    const table = await computeTable(tank, { atMm: rows.map(([depth]) => depth) });
    expect(table.heightMm).toBeCloseTo(heightMm, 9);
    expect(table.rows).toHaveLength(8);
    const worst = Math.max(...table.rows.map(({ volumeL }, i) => Math.abs(volumeL - rows[i]![1])));
    expect(worst / capacityL).toBeLessThan(1e-7);
    expect(Math.abs(table.capacityL / capacityL - 1)).toBeLessThan(1e-7);
    // the printed bound covers the true error
    expect(worst).toBeLessThan(table.errorL);
  });

  it('a single solid holds its closed form to 1e-9, and flat faces are exact', async () => {
    const [flatEnds, dished, tilted] = referenceTanks;
    for (const { tank, capacityL } of [flatEnds!, dished!]) {
      const table = await computeTable(tank, { stepMm: 500 });
      expect(Math.abs(table.capacityL / capacityL - 1)).toBeLessThan(1e-9);
    }
    const { tank, capacityL, rows } = tilted!;
    const table = await computeTable(tank, { atMm: rows.map(([depth]) => depth) });
    table.rows.forEach(({ volumeL }, i) => {
      expect(Math.abs(volumeL - rows[i]![1]) / capacityL).toBeLessThan(1e-12);
    });
  });

  /*
   * A comparison, not a claim: the law's tolerance is for a calibrated tank, with its tape and its dents; the bound
   * is of our computing alone, and is to be lost beside any of them.
   */
  it.each([
    // Council Directive 71/349/EEC, annex (OJ L 239, 25.10.1971, p. 15; repealed by 2011/17/EU): ships' tanks (V9.03)
    ['ships, 71/349/EEC', 0.003],
    // Arrêté du 18 décembre 1996, article 18: fixed storage tanks, alcohols; other liquids 0.4 % (V9.04)
    ['storage of alcohols in France, arrêté of 18 December 1996', 0.003],
    ['storage of other liquids in France, the same', 0.004],
    // OIML R 71, from memory: 0.2 % upright, 0.3 % lying or inclined, 0.5 % other tanks (V9.05)
    ['the tightest of OIML R 71', 0.002],
    ['lying tanks of OIML R 71', 0.003],
    ['other tanks of OIML R 71', 0.005],
  ] as const)('compute a thousand times closer than the law asks of %s', async (_, tolerance) => {
    for (const { tank } of referenceTanks) {
      const { errorL, capacityL } = await computeTable(tank, { stepMm: 100 });
      expect(errorL).toBeGreaterThan(0);
      expect(errorL / capacityL).toBeLessThan(tolerance / 1000);
    }
  });
});
