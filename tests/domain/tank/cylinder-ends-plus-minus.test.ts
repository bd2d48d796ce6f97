import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import { plusMinusOfTable } from '~/domain/table/uncertainty';
import type { End } from '~/domain/tank/kinds/cylinder/schema';
import { cylinder, design } from '../table/designs';

/** ± of the whole tank, litres, when every size is known to ± 1 mm and a dip is exact. */
async function brimPlusMinus(diameter: number, length: number, ends: [End, End]): Promise<number> {
  const tank = design([cylinder('vat', diameter, length, { ends })]);
  const table = await computeTable(tank, { stepMm: 50 });
  const measured = { sizePlusMinusMm: 1, dipPlusMinusMm: 0 };
  return (await plusMinusOfTable(tank, measured, table)).brimL;
}

const litres = (...mm3: number[]) => Math.hypot(...mm3) / 1e6;

/** Barrel with one torispherical end, mm³. */
function volume(d: number, l: number, c: number, k: number): number {
  const off = d / 2 - k;
  const t = Math.asin(off / (c - k));
  const h = c * (1 - Math.cos(t));
  const z = k * Math.cos(t);
  const ring =
    (off * off + k * k) * z - z ** 3 / 3 + off * (z * k * Math.sin(t) + k * k * (Math.PI / 2 - t));
  return (Math.PI / 4) * d * d * l + (Math.PI / 3) * h * h * (3 * c - h) + Math.PI * ring;
}

describe('the ± of sizes goes over each size of each end', () => {
  it('coned: V = π D²/4·L + π D²/12·(a + b)', async () => {
    const [D, L, a, b] = [500, 1000, 200, 90];
    const ends: [End, End] = [
      { form: 'cone', depth: a },
      { form: 'cone', depth: b },
    ];
    const byDiameter = (Math.PI * D * L) / 2 + (Math.PI * D * (a + b)) / 6;
    const byLength = (Math.PI * D * D) / 4;
    const byDepth = (Math.PI * D * D) / 12;
    const expected = litres(byDiameter, byLength, byDepth, byDepth);
    expect((await brimPlusMinus(D, L, ends)) / expected).toBeCloseTo(1, 2);
  });

  it('turned inward: a deeper one leaves less, and counts as much', async () => {
    const [D, L, a] = [500, 1000, 200];
    const ends: [End, End] = [{ form: 'ellipsoid', depth: a, inward: true }, { form: 'flat' }];
    const byDiameter = (Math.PI * D * L) / 2 - (Math.PI * D * a) / 3;
    const expected = litres(byDiameter, (Math.PI * D * D) / 4, (Math.PI * D * D) / 6);
    expect((await brimPlusMinus(D, L, ends)) / expected).toBeCloseTo(1, 2);
  });

  it('a hemisphere, which cannot be deeper than its radius: made less deep instead', async () => {
    // V = π D²/4·L + π h (3 D²/4 + h²)/6, at h = D/2: ∂V/∂h = π D²/4, ∂V/∂D at fixed h = π D L/2 + π D h/4
    const [D, L] = [500, 1000];
    const ends: [End, End] = [{ form: 'dish', depth: 250 }, { form: 'flat' }];
    const byDiameter = (Math.PI * D * L) / 2 + (Math.PI * D * 250) / 4;
    const byLength = (Math.PI * D * D) / 4;
    const expected = litres(byDiameter, byLength, byLength);
    expect((await brimPlusMinus(D, L, ends)) / expected).toBeCloseTo(1, 2);
  });

  it('crown and knuckle of a torisphere, by a difference of closed forms', async () => {
    const [D, L, crown, knuckle] = [500, 1000, 500, 50];
    const nominal = volume(D, L, crown, knuckle);
    const expected = litres(
      volume(D + 1, L, crown, knuckle) - nominal,
      volume(D, L + 1, crown, knuckle) - nominal,
      volume(D, L, crown + 1, knuckle) - nominal,
      volume(D, L, crown, knuckle + 1) - nominal,
    );
    const ends: [End, End] = [{ form: 'torisphere', crown, knuckle }, { form: 'flat' }];
    expect((await brimPlusMinus(D, L, ends)) / expected).toBeCloseTo(1, 3);
  });

  it('a torisphere whose crown is the radius: the barrel is made narrower instead', async () => {
    // a hair's breadth makes such an end much flatter: its depth goes as the root of crown − radius
    const [D, L, crown, knuckle] = [500, 1000, 250, 50];
    const nominal = volume(D, L, crown, knuckle);
    const expected = litres(
      volume(D - 1, L, crown, knuckle) - nominal,
      volume(D, L + 1, crown, knuckle) - nominal,
      volume(D, L, crown + 1, knuckle) - nominal,
    );
    const ends: [End, End] = [{ form: 'torisphere', crown, knuckle }, { form: 'flat' }];
    expect((await brimPlusMinus(D, L, ends)) / expected).toBeCloseTo(1, 3);
  });
});
