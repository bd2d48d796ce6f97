import { describe, expect, it } from 'vitest';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computeTable } from '~/domain/table/compute-table';
import type { Solid } from '~/domain/tank/kinds/registry';
import type { Stations } from '~/domain/tank/kinds/stations/schema';
import { stations as kind } from '~/domain/tank/kinds/stations/stations';
import { placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { loadManifold, meshOf } from '~/geometry/manifold';
import { enclosedVolume } from '~/geometry/mesh';
import { sweep } from '~/geometry/sweep';
import { unit, type Vec3 } from '~/geometry/vec3';
import { box, design, hull as hullOfWedges } from '../table/designs';

await loadManifold();

type Profile = [number, number][];

function stationsOf(
  sections: readonly (readonly [number, Profile])[],
  rest: Partial<Stations> = {},
): Stations {
  const list = sections.map(([x, profile]) => ({ x, profile }));
  return { id: 'h', role: 'holds', kind: 'stations', stations: list, ...rest };
}

const square = (side: number): Profile => [
  [-side / 2, -side / 2],
  [side / 2, -side / 2],
  [side / 2, side / 2],
  [-side / 2, side / 2],
];
const boat = kind.blank('boat');

/** A square that turns by an eighth on its way: every side is twisted. */
const turning = stationsOf([
  [0, square(400)],
  [
    600,
    [
      [0, -280],
      [280, 0],
      [0, 280],
      [-280, 0],
    ],
  ],
]);

describe('stations', () => {
  it('holds 56 as the square frustum 4 to 2, 6 long (Moscow Mathematical Papyrus, problem 14: V3.01)', async () => {
    const frustum = stationsOf([
      [0, square(400)],
      [600, square(200)],
    ]);
    expect(kind.volume(frustum)).toBeCloseTo(56e6, 6);
    expect(kind.curved(frustum)).toBe(false);
    const { capacityL, triangles } = await computeTable(design([frustum]), { stepMm: 100 });
    expect(capacityL).toBeCloseTo(56, 9);
    expect(triangles).toBe(12);
  });

  it('is the prismatoid rule when every side is twisted: A₁ + 4 Aₘ + A₂ (MathWorld "Prismatoid": V3.02)', () => {
    // areas 400², that of the octagon halfway, and 2·280²
    const middle: Profile = [
      [-100, -240],
      [240, -100],
      [100, 240],
      [-240, 100],
    ];
    const shoelace = (p: Profile) =>
      p.reduce((sum, [y, z], i) => {
        const [y2, z2] = p[(i + 1) % p.length]!;
        return sum + (y * z2 - z * y2) / 2;
      }, 0);
    const exact = (600 / 6) * (400 ** 2 + 4 * shoelace(middle) + 2 * 280 ** 2);
    expect(kind.volume(turning)).toBeCloseTo(exact, 6);
    expect(kind.curved(turning)).toBe('twice');
  });

  it('is the box, and the V hull of two wedges, that its stations draw', async () => {
    const v: Profile = [
      [0, 0],
      [300, 500],
      [-300, 500],
    ];
    const pairs: [Solid, Solid[]][] = [
      [
        stationsOf([
          [-100, square(300)],
          [250, square(300)],
          [500, square(300)],
        ]),
        [box('b', [600, 300, 300])],
      ],
      [
        stationsOf([
          [0, v],
          [1200, v],
        ]),
        hullOfWedges.solids,
      ],
    ];
    for (const [ours, same] of pairs) {
      for (const attitude of [
        { pitch: 0, roll: 0 },
        { pitch: 9, roll: -5 },
      ]) {
        const [one, other] = [
          await computeTable(design([ours], { attitude }), { stepMm: 25 }),
          await computeTable(design(same, { attitude }), { stepMm: 25 }),
        ];
        expect(one.heightMm).toBeCloseTo(other.heightMm, 9);
        one.rows.forEach(({ volumeL }, i) =>
          expect(volumeL).toBeCloseTo(other.rows[i]!.volumeL, 9),
        );
      }
    }
  });

  it('may run round in either direction and stand anywhere', async () => {
    const turnedRound = structuredClone(boat);
    for (const station of turnedRound.stations) {
      station.x += 5000;
      station.profile = station.profile
        .map(([y, z]): [number, number] => [y - 700, z + 300])
        .reverse();
    }
    const [one, other] = [
      await computeTable(design([boat]), { stepMm: 20 }),
      await computeTable(design([turnedRound]), { stepMm: 20 }),
    ];
    one.rows.forEach(({ volumeL }, i) =>
      expect(Math.abs(volumeL - other.rows[i]!.volumeL) / one.capacityL).toBeLessThan(1e-8),
    );
  });

  it.each([
    ['a boat', boat],
    ['a square that turns', turning],
    [
      'a section that goes in, twisted',
      stationsOf([
        [
          0,
          [
            [0, 0],
            [300, 0],
            [300, 200],
            [150, 90],
            [0, 200],
          ],
        ],
        [
          400,
          [
            [-40, 30],
            [310, -20],
            [280, 260],
            [150, 60],
            [20, 180],
          ],
        ],
        [
          700,
          [
            [0, 0],
            [300, 50],
            [300, 200],
            [170, 100],
            [0, 230],
          ],
        ],
      ]),
    ],
  ])('%s: exact volume at any facets; partly filled within 1e-7 of it at 256', (_, solid) => {
    const exact = kind.volume(solid);
    const [x, y, z] = kind.extent(solid);
    const meshes = [16, 48, 128, 256].map((facets) =>
      meshOf(placedShape(placedSolid(solid), facets), [x / 2, y / 2, z / 2]),
    );
    for (const mesh of meshes) expect(enclosedVolume(mesh) / exact).toBeCloseTo(1, 8);
    for (const up of [[0, 0, 1], unit([-0.2, 0.1, 1]), unit([-1, 0.5, 0.7])] as Vec3[]) {
      const reach = kind.support(solid, up);
      const levels = Float64Array.from({ length: 24 }, (__, i) => reach * ((i + 0.5) / 12 - 1));
      const swept = sweep(meshes[3]!, up, levels).volume;
      levels.forEach((level, i) => {
        const error = Math.abs(swept[i]! - belowPlane(solid, up, level)) / exact;
        expect(error).toBeLessThan(1e-7);
      });
    }
  });

  it('lines through it add up to its volume, however they run', () => {
    for (const solid of [boat, turning]) {
      for (const direction of [[1, 0, 0], unit([1, 0.3, 0.2]), unit([-0.2, 0.5, 1])] as Vec3[]) {
        const reach = Math.hypot(...kind.extent(solid)) / 2;
        // two directions square to the line
        const a = unit([-direction[1], direction[0], direction[0] === 0 ? 1 : 0] as Vec3);
        const b: Vec3 = [
          direction[1] * a[2] - direction[2] * a[1],
          direction[2] * a[0] - direction[0] * a[2],
          direction[0] * a[1] - direction[1] * a[0],
        ];
        const n = 120;
        let sum = 0;
        for (let i = 0; i < n; i += 1) {
          for (let j = 0; j < n; j += 1) {
            const [s, t] = [i, j].map((k) => ((k + 0.5) / n - 0.5) * 2 * reach) as [number, number];
            const origin: Vec3 = [a[0] * s + b[0] * t, a[1] * s + b[1] * t, a[2] * s + b[2] * t];
            for (const { from, to } of kind.chords(solid, { origin, direction }, 0))
              sum += to - from;
          }
        }
        expect((sum * ((2 * reach) / n) ** 2) / kind.volume(solid)).toBeCloseTo(1, 2);
      }
    }
  });

  it('is met by a stick on the keel, on an upright side and at its end', async () => {
    const heightAt = async (solid: Solid, x: number, y: number) =>
      (await computeTable(design([solid], { stick: { at: [x, y] } }), { stepMm: 50 })).heightMm;
    // y = 300 is the keel; the sheer at 0, 600, 1200 stands at 400, 410, 440, the bow's keel at 150
    expect(await heightAt(boat, 0, 300)).toBeCloseTo(400, 9);
    expect(await heightAt(boat, 600, 300)).toBeCloseTo(410, 9);
    expect(await heightAt(boat, 900, 300)).toBeCloseTo(425 - 75, 9);
    const even = stationsOf([
      [0, square(300)],
      [500, square(300)],
    ]);
    expect(await heightAt(even, 250, 0)).toBe(300);
    expect(await heightAt(even, 500, 300)).toBe(300);
    await expect(heightAt(even, 500.001, 100)).rejects.toThrow('does not stand over');
  });

  it('joins a deck house that stands on its flat deck, and is cut by what displaces', async () => {
    const flatDecked = stationsOf([
      [
        0,
        [
          [0, 0],
          [300, 400],
          [-300, 400],
        ],
      ],
      [
        900,
        [
          [0, 60],
          [200, 400],
          [-250, 400],
        ],
      ],
    ]);
    const house = box('house', [200, 200, 100], { at: [100, 200, 400] });
    const together = design([flatDecked, house]);
    expect(await checkIssuable(together)).toEqual([]);
    const { capacityL } = await computeTable(together, { stepMm: 100 });
    expect(capacityL).toBeCloseTo(kind.volume(flatDecked) / 1e6 + 4, 6);
    const cut = box('cut', [5000, 700, 50], { at: [-1, -1, 350], role: 'displaces' });
    const less = await computeTable(design([flatDecked, cut]), { stepMm: 100 });
    expect(less.capacityL).toBeLessThan(kind.volume(flatDecked) / 1e6);
    expect(less.heightMm).toBeCloseTo(350, 6);
  });
});

/** Volume below u·p = level, own frame: the section's area below the surface, integrated along x (Gauss, five points). */
function belowPlane(solid: Stations, up: Vec3, level: number): number {
  const nodes = [0, 0.5384693101056831, -0.5384693101056831, 0.906179845938664, -0.906179845938664];
  const weights = [
    128 / 225,
    0.4786286704993665,
    0.4786286704993665,
    0.2369268850561891,
    0.2369268850561891,
  ];
  const all = solid.stations.flatMap(({ x, profile }) => profile.map(([y, z]) => [x, y, z]));
  const middle = [0, 1, 2].map(
    (axis) => (Math.max(...all.map((p) => p[axis]!)) + Math.min(...all.map((p) => p[axis]!))) / 2,
  ) as [number, number, number];
  let volume = 0;
  for (let i = 0; i + 1 < solid.stations.length; i += 1) {
    const [low, high] = [solid.stations[i]!, solid.stations[i + 1]!];
    const parts = 1200;
    const half = (high.x - low.x) / parts / 2;
    for (let part = 0; part < parts; part += 1) {
      nodes.forEach((node, k) => {
        const along = half * (2 * part + 1 + node);
        const share = along / (high.x - low.x);
        const section = low.profile.map(([y, z], j) => {
          const [y2, z2] = high.profile[j]!;
          return [y + share * (y2 - y) - middle[1], z + share * (z2 - z) - middle[2]];
        });
        const rest = level - up[0] * (low.x + along - middle[0]);
        volume += half * weights[k]! * areaBelow(section as Profile, up, rest);
      });
    }
  }
  return volume;
}

/** Area of a polygon below a line; a polygon that goes in may fall in parts, joined by strips of no area. */
function areaBelow(section: Profile, [, uy, uz]: Vec3, level: number): number {
  const kept: Profile = [];
  section.forEach(([y, z], j) => {
    const [y2, z2] = section[(j + 1) % section.length]!;
    const [a, b] = [uy * y + uz * z - level, uy * y2 + uz * z2 - level];
    if (a <= 0) kept.push([y, z]);
    if (a <= 0 !== b <= 0) kept.push([y + (a / (a - b)) * (y2 - y), z + (a / (a - b)) * (z2 - z)]);
  });
  return kept.reduce((sum, [y, z], j) => {
    const [y2, z2] = kept[(j + 1) % kept.length]!;
    return sum + (y * z2 - z * y2) / 2;
  }, 0);
}
