import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import type { Solid } from '~/domain/tank/kinds/registry';
import { taper } from '~/domain/tank/kinds/taper/taper';
import type { Taper } from '~/domain/tank/kinds/taper/schema';
import { parseDesign } from '~/domain/tank/parse-design';
import { box, design } from '../table/designs';

const hopper = (rest: Partial<Taper>): Taper => ({
  id: 'hopper',
  role: 'holds',
  kind: 'taper',
  bottom: [200, 100],
  top: [600, 400],
  height: 300,
  ...rest,
});

describe('a taper', () => {
  it('holds 56 as the square frustum 4 to 2, 6 high (Moscow Mathematical Papyrus, problem 14: V3.01)', async () => {
    // and by the prismatoid rule, MathWorld "Prismatoid": 6/6·(16 + 4·9 + 4) = 56 (V3.02)
    const frustum = hopper({ bottom: [400, 400], top: [200, 200], height: 600 });
    expect(taper.volume(frustum)).toBeCloseTo(56e6, 6);
    const { capacityL } = await computeTable(design([frustum]), { stepMm: 100 });
    expect(capacityL).toBeCloseTo(56, 9);
  });

  it('is filled as the sum of the frusta below: sides grow evenly with the depth', async () => {
    const atMm = [0, 37, 150, 299.5, 300];
    const { rows } = await computeTable(design([hopper({ shift: [70, -200] })]), { atMm });
    rows.forEach(({ depthMm: h, volumeL, surfaceCm2 }) => {
      const [x, y] = [200 + (400 * h) / 300, 100 + h];
      const middle = ((200 + x) / 2) * ((100 + y) / 2);
      expect(volumeL).toBeCloseTo(((h / 6) * (200 * 100 + 4 * middle + x * y)) / 1e6, 9);
      expect(surfaceCm2).toBeCloseTo((x * y) / 100, 6);
    });
  });

  it('sheared over by its shift loses and gains nothing, and its box reaches over both ends', () => {
    expect(taper.volume(hopper({ shift: [900, 0] }))).toBe(taper.volume(hopper({})));
    expect(taper.extent(hopper({ shift: [900, 0] }))).toEqual([100 + 900 + 300, 400, 300]);
    expect(taper.extent(hopper({ shift: [-10, 250] }))).toEqual([600, 50 + 250 + 200, 300]);
  });

  it('is a box when both ends are alike: the same table to the last digit that counts', async () => {
    const even = hopper({ bottom: [600, 400], top: [600, 400] });
    const one = await computeTable(design([even], { attitude: { pitch: 7, roll: 4 } }), {
      stepMm: 25,
    });
    const other = await computeTable(
      design([box('b', [600, 400, 300])], { attitude: { pitch: 7, roll: 4 } }),
      { stepMm: 25 },
    );
    expect(one.heightMm).toBe(other.heightMm);
    one.rows.forEach(({ volumeL }, i) => expect(volumeL).toBeCloseTo(other.rows[i]!.volumeL, 9));
  });

  it('is met by a stick on its slope where the slope is', async () => {
    const { heightMm } = await computeTable(design([hopper({})], { stick: { at: [100, 200] } }), {
      stepMm: 50,
    });
    // the slope rises from x = 200 at the floor to x = 0 at the roof
    expect(heightMm).toBe(150);
  });

  it('joins what it stands on: a hopper under a bin is one space', async () => {
    const bin = box('bin', [600, 400, 200], { at: [0, 0, 300] });
    const { capacityL } = await computeTable(design([hopper({}), bin]), { stepMm: 50 });
    expect(capacityL).toBeCloseTo(taper.volume(hopper({})) / 1e6 + 48, 9);
  });

  it.each([
    [
      { top: [600, 0] },
      '/solids/0/top/1',
      'Solid "hopper", top, number 2: a length is more than 0 mm.',
    ],
    [
      { bottom: [600] },
      '/solids/0/bottom/1',
      'Solid "hopper", bottom, number 2: this field is missing.',
    ],
    [
      { bottom: 5 },
      '/solids/0/bottom',
      'Solid "hopper", bottom: give two lengths: along x, along y.',
    ],
    [{ shift: [0, 2e5] }, '/solids/0/shift/1', /a place lies within ± 100 000 mm/],
  ])('is refused where it is wrong: %j', (change, pointer, detail) => {
    expect(faultOf({ ...hopper({}), ...change } as unknown as Solid)).toEqual({
      pointer,
      detail: detail instanceof RegExp ? expect.stringMatching(detail) : detail,
    });
  });
});

function faultOf(solid: Solid) {
  try {
    parseDesign(design([solid]));
  } catch (error) {
    return (error as { faults: unknown[] }).faults[0];
  }
  return null;
}
