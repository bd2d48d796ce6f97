import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import type { TankDocument } from '~/domain/tank/document';
import type { DipwrightError } from '~/domain/errors';
import { box, cylinder, design, hull, slopedCistern, wedge } from './designs';

async function refusal(
  tank: TankDocument,
  readings: Parameters<typeof computeTable>[1] = { stepMm: 10 },
) {
  return computeTable(tank, readings).then(
    () => {
      throw new Error('was not refused');
    },
    (error: DipwrightError) => error,
  );
}

describe('rows', () => {
  it('run from 0 to the highest reading, both included, at the step', async () => {
    const { rows, heightMm } = await computeTable(slopedCistern, { stepMm: 40 });
    expect(heightMm).toBe(300);
    expect(rows.map(({ depthMm }) => depthMm)).toEqual([0, 40, 80, 120, 160, 200, 240, 280, 300]);
    expect((await computeTable(slopedCistern, { stepMm: 0.1 })).rows).toHaveLength(3001);
    expect(
      (await computeTable(slopedCistern, { stepMm: 500 })).rows.map(({ depthMm }) => depthMm),
    ).toEqual([0, 300]);
  });

  it('come in the order asked for, repeated where repeated', async () => {
    const { rows } = await computeTable(slopedCistern, { atMm: [150, 30, 150, 300, 0] });
    expect(rows.map(({ volumeL }) => volumeL)).toEqual([55.5, 4.5, 55.5, 123, 0]);
  });

  it('have the surface just above each level, and just below the brim', async () => {
    const step = design(
      [box('body', [100, 100, 100])].concat(box('shelf', [50, 100, 40], { role: 'displaces' })),
    );
    const { rows } = await computeTable(step, { atMm: [0, 39.9, 40, 100] });
    expect(rows.map(({ surfaceCm2 }) => Math.round(surfaceCm2 * 1e6) / 1e6)).toEqual([
      50, 50, 100, 100,
    ]);
  });

  it('have the centroid of the liquid in the frame of the tank', async () => {
    const far = design([box('body', [900, 500, 300], { at: [20_000, -7000, 400] })]);
    const { rows } = await computeTable(far, { atMm: [0, 100] });
    expect(rows[0]!.centroidMm).toEqual([20_450, -6750, 400]);
    rows[1]!.centroidMm.forEach((value, i) =>
      expect(value).toBeCloseTo([20_450, -6750, 450][i]!, 9),
    );
  });

  it('a floor along a line or at a point is empty at 0 and its centroid lies there', async () => {
    const { rows } = await computeTable(hull, { atMm: [0] });
    expect(rows[0]!.volumeL).toBe(0);
    expect(rows[0]!.surfaceCm2).toBe(0);
    rows[0]!.centroidMm.forEach((value, i) => expect(value).toBeCloseTo([600, 300, 0][i]!, 6));
  });
});

describe('the stick', () => {
  it('reads from the floor there to the roof there', async () => {
    const shallow = { ...slopedCistern, stick: { at: [900, 250] as [number, number] } };
    const table = await computeTable(shallow, { atMm: [0, 240] });
    expect(table.heightMm).toBe(240);
    // 60 mm stand in the sump when the stick at the shallow end is dry
    expect(table.rows[0]!.volumeL).toBeCloseTo(15, 9);
    expect(table.rows[1]!.volumeL).toBeCloseTo(123, 9);
  });

  it('stands beside a step when it stands on its edge, and over the floor at an end wall', async () => {
    const arch = design(
      [
        box('body', [900, 500, 300]),
        box('arch', [200, 100, 120], { role: 'displaces', at: [300, 0, 0] }),
      ],
      { stick: { at: [300, 50] } },
    );
    expect((await computeTable(arch, { stepMm: 100 })).heightMm).toBe(300);
    const onTop = { ...arch, stick: { at: [400, 0] as [number, number] } };
    expect((await computeTable(onTop, { stepMm: 100 })).heightMm).toBe(180);
    const corner = { ...arch, stick: { at: [0, 0] as [number, number] } };
    expect((await computeTable(corner, { stepMm: 100 })).heightMm).toBe(300);
  });

  it('takes the lowest open stretch, or the one above its zero', async () => {
    const shelf = box('shelf', [100, 500, 20], { role: 'displaces', at: [0, 0, 140] });
    const split = design([box('body', [900, 500, 300]), shelf], { stick: { at: [50, 250] } });
    expect((await computeTable(split, { stepMm: 50 })).heightMm).toBe(140);
    const upper = { ...split, stick: { at: [50, 250] as [number, number], zero: 160 } };
    const table = await computeTable(upper, { atMm: [0] });
    expect(table.heightMm).toBe(140);
    expect(table.rows[0]!.volumeL).toBeCloseTo((900 * 500 * 160 - 100 * 500 * 20) / 1e6, 9);
  });

  it('has its floor and roof from closed form under a round roof', async () => {
    const lying = design([cylinder('c', 1200, 2000)], { stick: { at: [1000, 300] } });
    const { heightMm } = await computeTable(lying, { stepMm: 100 });
    expect(heightMm).toBeCloseTo(2 * Math.sqrt(600 ** 2 - 300 ** 2), 9);
  });

  it('runs along the tank when the tank is tilted', async () => {
    // 10° down at +x: level under the stick at x = 500 rises by cos 10° a millimetre of stick
    const tank = design([box('body', [1000, 400, 300])], {
      attitude: { pitch: 10, roll: 0 },
      stick: { at: [500, 200] },
    });
    const { rows, heightMm } = await computeTable(tank, { atMm: [0, 150, 300] });
    expect(heightMm).toBe(300);
    // by symmetry half full at the middle
    expect(rows[1]!.volumeL).toBeCloseTo(60, 9);
    // reading 0: the wedge over the lower half of the floor, ½·500·500·tan 10°·400
    expect(rows[0]!.volumeL).toBeCloseTo((0.5 * 500 * 500 * Math.tan(Math.PI / 18) * 400) / 1e6, 9);
    expect(rows[2]!.volumeL).toBeCloseTo(120 - rows[0]!.volumeL, 9);
  });

  it('is refused where nothing holds liquid', async () => {
    const error = await refusal({ ...slopedCistern, stick: { at: [950, 250] } });
    expect(error.message).toBe(
      'The stick does not stand over the liquid space: there is none at x 950, y 250. Move the stick.',
    );
    expect(error.faults[0]!.pointer).toBe('/stick/at');
    const column = box('column', [100, 100, 300], { role: 'displaces', at: [400, 200, 0] });
    const blocked = design([box('body', [900, 500, 300]), column], { stick: { at: [450, 250] } });
    expect((await refusal(blocked)).faults[0]!.pointer).toBe('/stick/at');
  });

  it('is refused when its zero lies at the roof or above', async () => {
    const error = await refusal({ ...slopedCistern, stick: { at: [50, 250], zero: 300 } });
    expect(error.faults[0]!.pointer).toBe('/stick/zero');
  });
});

describe('refusals', () => {
  it('name a reading outside the range', async () => {
    const error = await refusal(slopedCistern, { atMm: [0, 300, 300.1] });
    expect(error.code).toBe('invalid');
    expect(error.faults).toEqual([
      {
        pointer: '/atMm/2',
        detail: 'A reading of 300.1 mm lies outside 0 to 300 mm, the range of this tank.',
      },
    ]);
    expect((await refusal(slopedCistern, { atMm: [-1] })).faults[0]!.pointer).toBe('/atMm/0');
  });

  it('ask for a larger step instead of too many rows', async () => {
    expect((await refusal(slopedCistern, { stepMm: 0.01 })).message).toMatch(
      /more than 20000 rows: take 0.02 mm/,
    );
  });

  it('name an empty liquid space', async () => {
    const gone = design([
      box('body', [9, 5, 3]),
      box('hole', [10, 10, 10], { role: 'displaces', at: [-0.5, -1, -1] }),
    ]);
    expect((await refusal(gone)).message).toMatch(/empty: what displaces takes away all/);
    const nothing = design([box('hole', [10, 10, 10], { role: 'displaces' })]);
    expect((await refusal(nothing)).message).toMatch(/no solid has the role "holds"/);
  });

  it('name sizes that are nothing', async () => {
    const flat = await refusal(design([box('body', [900, 500, 0.001])]));
    expect(flat.faults).toEqual([
      { pointer: '/solids/0/height', detail: 'Solid "body", height: a size is at least 0.01 mm.' },
    ]);
  });
});

describe('the bound', () => {
  it('is rounding where nothing is round', async () => {
    const { errorL, capacityL } = await computeTable(hull, { stepMm: 10 });
    expect(errorL / capacityL).toBeCloseTo(1e-9, 15);
  });

  it('covers the true error of a tilted cylinder', async () => {
    // section by section: the circular segment at each place along the axis, Simpson over 20 000 slices
    const r = 300;
    const length = 1500;
    const slope = Math.tan((7 * Math.PI) / 180);
    const tank = design([cylinder('c', 2 * r, length)], {
      attitude: { pitch: 7, roll: 0 },
      stick: { at: [750, 300] },
    });
    const atMm = [40, 150, 300, 421, 560];
    const table = await computeTable(tank, { atMm });
    table.rows.forEach(({ volumeL }, i) => {
      const segment = (x: number) => {
        const h = Math.min(Math.max(atMm[i]! + (x - 750) * slope, 0), 2 * r);
        return r * r * Math.acos((r - h) / r) - (r - h) * Math.sqrt(Math.max(2 * r * h - h * h, 0));
      };
      const n = 20_000;
      let sum = segment(0) + segment(length);
      for (let k = 1; k < n; k += 1) sum += (k % 2 ? 4 : 2) * segment((k * length) / n);
      const exactL = (sum * length) / n / 3 / 1e6;
      expect(Math.abs(volumeL - exactL) / table.capacityL).toBeLessThan(1e-7);
      expect(Math.abs(volumeL - exactL)).toBeLessThan(Math.max(table.errorL, 1e-7));
    });
  });
});

describe('outlet and vent', () => {
  it('say what stays in a level box with two sumps, and the air a baffle keeps', async () => {
    const tank = design(
      [
        box('body', [1000, 400, 300]),
        box('sill', [200, 400, 100], { role: 'displaces', at: [300, 0, 0] }),
        box('baffle', [10, 400, 50], { role: 'displaces', at: [700, 0, 250] }),
      ],
      { outlet: [100, 200, 20], vent: [100, 200, 300] },
    );
    const { undrainableL, trappedL } = await computeTable(tank, { stepMm: 100 });
    expect(undrainableL).toBeCloseTo(2.4 + 20, 9);
    expect(trappedL).toBeCloseTo((290 * 400 * 50) / 1e6, 9);
  });

  it('say nothing when there is none', async () => {
    const { undrainableL, trappedL } = await computeTable(slopedCistern, { stepMm: 100 });
    expect([undrainableL, trappedL]).toEqual([0, 0]);
  });

  it('work on a round wall: what lies below an outlet in the end of a lying cylinder', async () => {
    const tank = design([cylinder('c', 1000, 2000)], { outlet: [0, 500, 100] });
    const { undrainableL } = await computeTable(tank, { stepMm: 100 });
    const segment = 500 ** 2 * Math.acos(0.8) - 400 * 300;
    expect(undrainableL / ((segment * 2000) / 1e6)).toBeCloseTo(1, 5);
    const lowest = design([cylinder('c', 1000, 2000)], { outlet: [1000, 500, 0] });
    expect((await computeTable(lowest, { stepMm: 100 })).undrainableL).toBeLessThan(0.001);
  });

  it('are refused outside the liquid space', async () => {
    const outside = await refusal({ ...slopedCistern, outlet: [50, 250, -1] });
    expect(outside.faults[0]!.pointer).toBe('/outlet');
    expect((await refusal({ ...slopedCistern, vent: [850, 250, 30] })).faults[0]!.pointer).toBe(
      '/vent',
    );
  });
});

describe('turned and mirrored tanks', () => {
  it('hold the same whichever way they are described', async () => {
    const upright = await computeTable(design([cylinder('c', 400, 700, { axis: 'z' })]), {
      stepMm: 50,
    });
    const turned = await computeTable(
      design([cylinder('c', 400, 700, { axis: 'x', turn: [0, -90, 0] })]),
      { stepMm: 50 },
    );
    turned.rows.forEach(({ volumeL }, i) =>
      expect(volumeL).toBeCloseTo(upright.rows[i]!.volumeL, 7),
    );
    const round = await computeTable(design([wedge('w', [300, 200, 100], { turn: [0, 0, 360] })]), {
      stepMm: 10,
    });
    const plain = await computeTable(design([wedge('w', [300, 200, 100])]), { stepMm: 10 });
    expect(round.rows).toEqual(plain.rows);
  });
});
