import { describe, expect, it } from 'vitest';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computeTable } from '~/domain/table/compute-table';
import { prism } from '~/domain/tank/kinds/prism/prism';
import type { Prism } from '~/domain/tank/kinds/prism/schema';
import type { Solid } from '~/domain/tank/kinds/registry';
import { placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { loadManifold, meshOf } from '~/geometry/manifold';
import { enclosedVolume } from '~/geometry/mesh';
import { box, cylinder, design, hull, wedge } from '../table/designs';

await loadManifold();

type Profile = Prism['profile'];

function prismOf(profile: Profile, width = 100, rest: Partial<Prism> = {}): Prism {
  return { id: 'p', role: 'holds', kind: 'prism', profile, width, ...rest };
}

const steps = { stepMm: 20 };
const litres = async (solids: Solid[], readings = steps, rest = {}) =>
  (await computeTable(design(solids, rest), readings)).rows.map(({ volumeL }) => volumeL);

const square: Profile = [
  [0, 0],
  [400, 0],
  [400, 400],
  [0, 400],
];
const rounded = (...radii: readonly number[]): Profile =>
  square.map(([x, z], i) => [x, z, radii[i]!]);

describe('a prism of flat sides', () => {
  it('is the box, the wedge and the V hull that its profile draws', async () => {
    const tilted = { attitude: { pitch: 11, roll: -6 } };
    const pairs: [Solid[], Solid[]][] = [
      [[prismOf(square)], [box('b', [400, 100, 400])]],
      [
        [
          prismOf([
            [0, 300],
            [0, 0],
            [700, 0],
          ]),
        ],
        [wedge('w', [700, 100, 300])],
      ],
      // keel down; the hull of two wedges lies along x, so the prism is turned
      [
        [
          prismOf(
            [
              [300, 0],
              [600, 500],
              [0, 500],
            ],
            1200,
            { turn: [0, 0, 90] },
          ),
        ],
        hull.solids,
      ],
    ];
    for (const [ours, same] of pairs) {
      const [one, other] = [await litres(ours, steps, tilted), await litres(same, steps, tilted)];
      expect(one).toHaveLength(other.length);
      one.forEach((value, i) => expect(value).toBeCloseTo(other[i]!, 8));
    }
  });

  it('may be given in either direction, from any point, and anywhere: at still places its box', async () => {
    const profile: Profile = [
      [0, 0],
      [500, 0],
      [500, 200],
      [200, 200],
      [200, 300],
      [0, 300],
    ];
    const expected = await litres([prismOf(profile)]);
    const others: Profile[] = [
      [...profile].reverse(),
      [...profile.slice(4), ...profile.slice(0, 4)],
      profile.map(([x, z]) => [x - 1234.5, z + 77.25]),
    ];
    for (const other of others) expect(await litres([prismOf(other)])).toEqual(expected);
  });

  it('of an L, a U and a comb holds what its boxes hold', async () => {
    const u: Profile = [
      [0, 0],
      [500, 0],
      [500, 300],
      [400, 300],
      [400, 100],
      [150, 100],
      [150, 300],
      [0, 300],
    ];
    const boxes = [
      box('floor', [500, 100, 100]),
      box('left', [150, 100, 300]),
      box('right', [100, 100, 300], { at: [400, 0, 0] }),
    ];
    for (const rest of [{}, { attitude: { pitch: 8, roll: 3 } }]) {
      const [one, other] = [
        await litres([prismOf(u)], steps, rest),
        await litres(boxes, steps, rest),
      ];
      one.forEach((value, i) => expect(value).toBeCloseTo(other[i]!, 9));
    }
    // 24 teeth of 10 × 50 on a back of 480 × 20: 100 points
    const teeth = Array.from({ length: 25 }, (_, i): Profile => [
      [20 * i, 20],
      [20 * i, 70],
      [20 * i + 10, 70],
      [20 * i + 10, 20],
    ]).flat();
    const comb = prismOf(
      [[0, 0] as [number, number], ...teeth.slice(1, 99), [490, 20], [490, 0]].slice(
        0,
        101,
      ) as Profile,
    );
    expect(comb.profile.length).toBeGreaterThan(99);
    const rows = await litres([comb], { stepMm: 10 });
    expect(rows).toHaveLength(8);
    const area = (h: number) =>
      490 * Math.min(h, 20) + (h > 20 ? 24.5 * 10 * (h - 20) + 5 * (h - 20) : 0);
    rows.forEach((value, i) => expect(value).toBeCloseTo((area(10 * i) * 100) / 1e6, 9));
  });

  it('keeps its volume with points that lie nearly in a line, alone and cut by another solid', async () => {
    const wavy: Profile = [
      ...Array.from({ length: 90 }, (_, i): [number, number] => [10 * i, (i % 2) * 1e-7 * (i % 7)]),
      [900, 0],
      [900, 300],
      [400, 250],
      [0, 300],
    ];
    const alone = prismOf(wavy, 200);
    const mesh = meshOf(placedShape(placedSolid(alone), 64), [0, 0, 0]);
    expect(enclosedVolume(mesh) / prism.volume(alone)).toBeCloseTo(1, 9);
    const cut = box('cut', [50, 200, 100], { at: [300, 0, 0], role: 'displaces' });
    const { capacityL } = await computeTable(design([alone, cut]), steps);
    expect(capacityL).toBeCloseTo(prism.volume(alone) / 1e6 - 1, 6);
  });

  it('lets a stick stand on its upright faces and in its steps', async () => {
    const l = prismOf([
      [0, 0],
      [500, 0],
      [500, 200],
      [200, 200],
      [200, 300],
      [0, 300],
    ]);
    const heightAt = async (x: number, y: number, zero?: number) =>
      (
        await computeTable(
          design([l], { stick: { at: [x, y], ...(zero === undefined ? {} : { zero }) } }),
          steps,
        )
      ).heightMm;
    expect(await heightAt(0, 50)).toBe(300);
    expect(await heightAt(500, 100)).toBe(200);
    expect(await heightAt(350, 0)).toBe(200);
    expect(await heightAt(100, 50, 120)).toBe(180);
    await expect(heightAt(500.001, 50)).rejects.toThrow('does not stand over the liquid space');
    // on the riser of the step, the column of the higher side counts: there is liquid space over all of it
    expect(await heightAt(200, 50)).toBe(300);
    const asDisplacer = { ...l, role: 'displaces' as const };
    const around = design([box('body', [600, 100, 400]), asDisplacer], {
      stick: { at: [500, 50] },
    });
    expect((await computeTable(around, steps)).heightMm).toBe(400);
  });
});

describe('a prism with rounded corners', () => {
  it('loses r² (1 − π/4) at a square corner that stands out and gains it at one that goes in', () => {
    const lost = (1 - Math.PI / 4) * 30 ** 2;
    expect(prism.volume(prismOf(rounded(30, 0, 0, 0), 1))).toBeCloseTo(160_000 - lost, 8);
    const step: Profile = [
      [0, 0],
      [500, 0],
      [500, 200],
      [200, 200, 30],
      [200, 300],
      [0, 300],
    ];
    expect(prism.volume(prismOf(step, 1))).toBeCloseTo(120_000 - 10_000 + 10_000 + lost, 8);
    // a corner of 60°: r² (√3 − π/3) lies between it and its arc
    const triangle: Profile = [
      [0, 0, 60],
      [600, 0],
      [300, 300 * Math.sqrt(3)],
    ];
    const between = 60 ** 2 * (Math.sqrt(3) - Math.PI / 3);
    expect(prism.volume(prismOf(triangle, 1))).toBeCloseTo(90_000 * Math.sqrt(3) - between, 7);
  });

  it('is the cylinder at its greatest radius, to what facets leave (6e-8 at 256)', async () => {
    const atMm = [20, 71.3, 200, 333, 399];
    for (const rest of [{}, { attitude: { pitch: 20, roll: 9 } }]) {
      const whole = design([prismOf(rounded(200, 200, 200, 200), 700)], rest);
      const round = design([cylinder('c', 400, 700, { axis: 'y' } as Partial<Solid>)], rest);
      const [one, other] = [
        await computeTable(whole, { atMm }),
        await computeTable(round, { atMm }),
      ];
      expect(one.capacityL / other.capacityL).toBeCloseTo(1, 8);
      one.rows.forEach(({ volumeL }, i) => {
        expect(Math.abs(volumeL - other.rows[i]!.volumeL) / one.capacityL).toBeLessThan(3e-8);
      });
      expect(one.errorL / one.capacityL).toBeLessThan(2e-7);
    }
  });

  it('fills as its section: lying stadium, level, against the circular segment', async () => {
    const atMm = Array.from({ length: 41 }, (_, i) => 5 * i);
    const stadium: Profile = [
      [0, 0, 100],
      [700, 0, 100],
      [700, 200, 100],
      [0, 200, 100],
    ];
    const { rows, capacityL } = await computeTable(design([prismOf(stadium, 300)]), { atMm });
    rows.forEach(({ depthMm, volumeL }) => {
      const c = depthMm - 100;
      const segment = (Math.PI * 1e4) / 2 + c * Math.sqrt(1e4 - c * c) + 1e4 * Math.asin(c / 100);
      const exact = ((segment + 500 * depthMm) * 300) / 1e6;
      expect(Math.abs(volumeL - exact) / capacityL).toBeLessThan(1e-8);
    });
  });

  it('has the box of what is left: a rounded keel stands on the arc', () => {
    const keel: Profile = [
      [300, 0, 50],
      [600, 300],
      [0, 300],
    ];
    // the arc between sides at 45° lies r (√2 − 1) short of the corner
    expect(prism.extent(prismOf(keel))).toEqual([
      600,
      100,
      expect.closeTo(300 - 50 * (Math.SQRT2 - 1), 9),
    ]);
  });

  it('may stand on a flat face of a neighbour: that is no touching of round solids', async () => {
    const onTop = prismOf(rounded(0, 0, 60, 60), 100, { at: [0, 0, 200] });
    expect(await checkIssuable(design([box('b', [400, 100, 200]), onTop]))).toEqual([]);
    const roundDown = prismOf(rounded(200, 200, 200, 200), 100, { at: [0, 0, 200] });
    expect((await checkIssuable(design([box('b', [400, 100, 200]), roundDown]))).join()).toMatch(
      /touches another along a line|pieces/,
    );
  });
});
