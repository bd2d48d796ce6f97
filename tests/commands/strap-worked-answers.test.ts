import { describe, expect, it } from 'vitest';
import type { End } from '~/domain/tank/kinds/cylinder/schema';
import { box, cylinder, design, hull, slopedCistern, wedge } from '../domain/table/designs';
import { tableByCommand } from '../support/strap-child';

/** Worked by hand, each design in one call of the command. */
async function litresAt(tank: unknown, ...depths: number[]): Promise<number[]> {
  return (await tableByCommand(tank, depths)).rows.map(({ volumeL }) => volumeL);
}

describe('worked answers through the command', { timeout: 60_000 }, () => {
  describe('sloped water tank', () => {
    it('holds 4.5, 15.0, 55.5 and 123.0 L by inside sizes', async () => {
      // by hand: 0.05 h + h²/300 up to 60 mm, then 15 + 0.45 (h − 60)
      const litres = await litresAt(slopedCistern, 30, 60, 150, 300, 270);
      const [low, , half, brim, high] = litres;
      expect(litres.map((value) => Math.round(value * 1e6) / 1e6)).toEqual([
        4.5, 15, 55.5, 123, 109.5,
      ]);
      // half the height is not half full: 6.0 L and 10.8 % too much
      expect(brim! / 2 - half!).toBeCloseTo(6, 6);
      expect(((brim! / 2 - half!) / half!) * 100).toBeCloseTo(10.8, 1);
      // seen between the stops of a float, 30 and 270 mm: 4.5 L hidden below, 13.5 L above
      expect(low).toBeCloseTo(4.5, 6);
      expect(brim! - high!).toBeCloseTo(13.5, 6);
    });

    it('holds 133.4 L where its outside sizes are taken as inside, 123 within a wall of 6 mm', async () => {
      // the tank measured outside, 912 × 512 × 312: its floor rises on the last 800 mm of the outside
      const measured = (ramp: readonly [x: number, z: number]) =>
        design(
          [
            box('body', [912, 512, 312]),
            wedge('ramp', [800, 512, 60], {
              role: 'displaces',
              at: [ramp[0], 0, ramp[1]],
              turn: [0, 0, 180],
            }),
          ],
          { stick: { at: [56, 256] } },
        );
      // 512·(912·312 − ½·800·60)
      const taken = await tableByCommand(measured([112, 0]), [312]);
      expect(taken.capacityL).toBeCloseTo(133.398528, 6);
      expect(taken.rows[0]!.volumeL).toBeCloseTo(133.398528, 6);
      expect(taken.capacityL / 123 - 1).toBeCloseTo(0.085, 3);

      const wall = { thickness: 6, sizes: 'outside' };
      // the ramp's inner face stands on the inner floor and reaches the inner end
      const within = await litresAt({ ...measured([106, 6]), wall }, ...[0, 30, 60, 150, 300]);
      [0, 4.5, 15, 55.5, 123].forEach((litres, i) => expect(within[i]).toBeCloseTo(litres, 6));
      // drawn on the outside of the floor, the ramp stands lower and further off: 125.4 L
      const { capacityL } = await tableByCommand({ ...measured([112, 0]), wall }, [0]);
      const rise = ((906 - 112) * 60) / 800 - 6;
      expect(capacityL).toBeCloseTo((900 * 500 * 300 - (500 * (906 - 192) * rise) / 2) / 1e6, 6);
      expect(Math.abs(capacityL - 123)).toBeLessThan(2.5);
    });
  });

  it('V hull: 0.00072 h² litres; half the stick is a quarter tank; 1.15 L under the pick-up', async () => {
    const depths = [40, 250, 353.6, 372.7, 487.3, 500];
    const { rows, undrainableL, capacityL } = await tableByCommand(
      { ...hull, outlet: [600, 300, 40] },
      depths,
    );
    const litres = rows.map(({ volumeL }) => volumeL);
    depths.forEach((h, i) => expect(litres[i]).toBeCloseTo(0.00072 * h * h, 6));
    expect(litres[1]).toBeCloseTo(45, 6);
    expect(litres[1]! / capacityL).toBeCloseTo(0.25, 9);
    expect(litres[2]).toBeCloseTo(90, 1);
    expect(litres[3]).toBeCloseTo(100, 1);
    expect(litres[4]).toBeCloseTo(171, 1);
    expect(litres[5]).toBeCloseTo(180, 6);
    expect(undrainableL).toBeCloseTo(0.00072 * 1600, 6);
    // usable to the safe fill of 95 %
    expect(0.95 * capacityL - undrainableL).toBeCloseTo(169.85, 2);
  });

  describe('cylinder 500 × 1000 lying down', () => {
    const withEnds = (end: End) => design([cylinder('c', 500, 1000, { ends: [end, end] })]);

    it('with 2:1 elliptical ends: 43.50, 114.54, 217.94, 229.07 L, and 100 L at 225.7 mm', async () => {
      const tank = withEnds({ form: 'ellipsoid', depth: 125 });
      const { rows, capacityL } = await tableByCommand(tank, [125, 225.7, 250, 450, 500]);
      [43.5, 100, 114.54, 217.94, 229.07].forEach((litres, i) =>
        expect(Math.abs(rows[i]!.volumeL - litres)).toBeLessThan(i === 1 ? 0.05 : 0.005),
      );
      // 100 L falls on the tenth of a millimetre that is named
      const surfaceLPerMm = rows[1]!.surfaceCm2 * 1e-4;
      expect(Math.abs(rows[1]!.volumeL - 100)).toBeLessThan(surfaceLPerMm * 0.05);
      expect(rows[0]!.volumeL / capacityL).toBeCloseTo(0.19, 3);
    });

    it('with torispherical ends, crown 500, knuckle 50: 42.26, 110.55 and 221.09 L', async () => {
      const tank = withEnds({ form: 'torisphere', crown: 500, knuckle: 50 });
      const { rows } = await tableByCommand(tank, [125, 250, 500]);
      [42.26, 110.55, 221.09].forEach((litres, i) =>
        expect(Math.abs(rows[i]!.volumeL - litres)).toBeLessThan(0.05),
      );
    });

    it('with flat ends: 196.35 L, 14 % less than with elliptical ones', async () => {
      const { rows, capacityL } = await tableByCommand(withEnds({ form: 'flat' }), [125, 250]);
      expect(capacityL).toBeCloseTo(196.3495, 4);
      expect(capacityL / 229.07 - 1).toBeCloseTo(-0.143, 3);
      // R²·acos((R − h)/R) − (R − h)·√(2Rh − h²) at 125 mm
      expect(Math.abs(rows[0]!.volumeL - 38.3865)).toBeLessThan(0.0005);
      expect(rows[1]!.volumeL).toBeCloseTo(98.1748, 4);
    });
  });

  it('heating oil, lying cylinder 1200 × 2000: 703 L at 16 4/8 in, limit 2194.1 L at 1117 mm', async () => {
    const inchMm = 25.4;
    const oil = design([cylinder('tank', 1200, 2000)], { stick: { at: [1000, 600] } });
    const [dip, wrong, eighthMore, limit, reserve, full] = await litresAt(
      oil,
      ...[16.5 * inchMm, 16.4 * inchMm, 16.625 * inchMm, 1117, 141.6, 1200],
    );
    expect(Math.abs(dip! - 703.5)).toBeLessThan(0.1);
    expect(Math.abs(wrong! - 697.7)).toBeLessThan(0.1);
    expect(Math.abs(eighthMore! - dip! - 7.3)).toBeLessThan(0.05);
    // 97 % of brim: one millimetre of stick is 1.2 L there
    expect(Math.abs(limit! - 2194.1)).toBeLessThan(1);
    expect(Math.abs(reserve! - 150)).toBeLessThan(0.1);
    expect(full).toBeCloseTo(2261.9467, 4);
    // room in litres, imperial and US gallons (4.54609 and 3.785411784 L)
    const room = 0.97 * full! - dip!;
    expect(Math.abs(room - 1490.6)).toBeLessThan(0.1);
    expect(room / 4.54609).toBeCloseTo(327.9, 1);
    expect(room / 3.785411784).toBeCloseTo(393.8, 1);
    // 12.5 L a day down to a reserve of 150 L
    expect(Math.floor((dip! - 150) / 12.5)).toBe(44);
  });
});
