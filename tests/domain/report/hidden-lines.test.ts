import { describe, expect, it } from 'vitest';
import { elevation } from '~/domain/report/elevation';
import { sketchDesign } from '~/domain/report/sketch-design';
import type { TankMesh } from '~/domain/table/preview';
import type { Solid } from '~/domain/tank/kinds/registry';
import { box, cylinder, design } from '../table/designs';
import { prismMesh } from './sample-charts';

/** Prisms along y, each from its own y, as one mesh. */
function behindEachOther(
  ...prisms: { profile: [number, number][]; from: number; length: number }[]
): TankMesh {
  const positions: number[] = [];
  const triangles: number[] = [];
  for (const { profile, from, length } of prisms) {
    const mesh = prismMesh(profile, length, 'y');
    const first = positions.length / 3;
    mesh.positions.forEach((value, i) => positions.push(i % 3 === 1 ? value + from : value));
    mesh.triangles.forEach((vertex) => triangles.push(vertex + first));
  }
  return { positions: Float64Array.from(positions), triangles: Uint32Array.from(triangles) };
}

const rectangle = (x1: number, z1: number, x2: number, z2: number): [number, number][] => [
  [x1, z1],
  [x2, z1],
  [x2, z2],
  [x1, z2],
];

type Line = ReturnType<typeof elevation>['lines'][number];

const level = (lines: readonly Line[], y: number) =>
  lines
    .filter(({ y1, y2 }) => Math.abs(y1 - y) < 0.1 && Math.abs(y2 - y) < 0.1)
    .map(({ x1, x2, hidden }) => ({ from: Math.min(x1, x2), to: Math.max(x1, x2), hidden }))
    .sort((a, b) => a.from - b.from);

const lengthOf = ({ x1, y1, x2, y2 }: Line) => Math.hypot(x2 - x1, y2 - y1);

const hull: Solid = {
  kind: 'stations',
  id: 'hull',
  role: 'holds',
  stations: [
    { x: 0, profile: hullSection(0, 250, 120, 300, 400) },
    { x: 600, profile: hullSection(0, 230, 140, 300, 410) },
    { x: 1200, profile: hullSection(150, 60, 260, 80, 440) },
  ],
};

function hullSection(
  keel: number,
  chineY: number,
  chineZ: number,
  sheerY: number,
  sheerZ: number,
): [number, number][] {
  return [
    [0, keel],
    [chineY, chineZ],
    [sheerY, sheerZ],
    [-sheerY, sheerZ],
    [-chineY, chineZ],
  ];
}

describe('an edge', () => {
  it('is hidden where a narrower body stands before it, and seen to either side', () => {
    const { lines } = elevation(
      behindEachOther(
        { profile: rectangle(300, 0, 600, 300), from: 0, length: 100 },
        { profile: rectangle(0, 50, 900, 200), from: 300, length: 100 },
      ),
      'side',
    );
    for (const y of [50, 200]) {
      expect(level(lines, y)).toEqual([
        { from: 0, to: expect.closeTo(300, 5), hidden: false },
        { from: expect.closeTo(300, 5), to: expect.closeTo(600, 5), hidden: true },
        { from: expect.closeTo(600, 5), to: 900, hidden: false },
      ]);
    }
  });

  it('behind one leg of a turned U is hidden, and seen between the legs', async () => {
    // legs 250 wide; seen from the side, 30° turned, 400 deep: what is x apart shows as x·cos 30°
    const profile: [number, number][] = [
      [0, 0],
      [900, 0],
      [900, 600],
      [650, 600],
      [650, 200],
      [250, 200],
      [250, 600],
      [0, 600],
    ];
    const { lines, view } = await sketchDesign(
      design([{ id: 'u', role: 'holds', kind: 'prism', width: 400, profile, turn: [0, 0, 30] }]),
    );
    expect(view).toBe('side');
    const floor = level(lines, 200);
    const seen = floor.filter(({ hidden }) => !hidden);
    const hidden = floor.filter((part) => part.hidden);
    // near rim 400·cos 30° long from the near leg; the far rim lies 400·sin 30° further left
    const legRight = 400 * Math.sin(Math.PI / 6) + 250 * Math.cos(Math.PI / 6);
    const farLeft = legRight - 200;
    const nearRight = legRight + 400 * Math.cos(Math.PI / 6);
    expect(hidden).toEqual([
      { from: expect.closeTo(farLeft, 3), to: expect.closeTo(legRight, 3), hidden: true },
    ]);
    expect(seen).toEqual([
      { from: expect.closeTo(legRight, 3), to: expect.closeTo(nearRight, 3), hidden: false },
    ]);
  });

  it('behind the line between two triangles of a flat face is hidden', () => {
    // the near face is cut from corner to corner; the far edge lies on that line
    const { lines } = elevation(
      behindEachOther(
        { profile: rectangle(0, 0, 300, 300), from: 0, length: 50 },
        {
          profile: [
            [100, 100],
            [200, 100],
            [200, 200],
          ],
          from: 100,
          length: 50,
        },
      ),
      'side',
    );
    const inside = lines.filter(({ x1 }) => x1 > 1 && x1 < 299);
    expect(inside).toHaveLength(3);
    expect(inside.every(({ hidden }) => hidden)).toBe(true);
  });

  it('under a seen line is not drawn again', () => {
    const { lines } = elevation(
      behindEachOther(
        { profile: rectangle(0, 0, 900, 300), from: 0, length: 100 },
        { profile: rectangle(0, 0, 500, 200), from: 300, length: 100 },
      ),
      'side',
    );
    expect(lines.filter(({ hidden }) => !hidden)).toHaveLength(4);
    // the far one's bottom and left edges lie under the near one's
    expect(
      lines
        .filter(({ hidden }) => hidden)
        .map(lengthOf)
        .sort(),
    ).toEqual([200, 500]);
  });
});

describe('the sketch of a design', () => {
  it('of a barrel with one end turned in and one torisphere is a whole circle from the end', async () => {
    const barrel = cylinder('b', 600, 1000, {
      ends: [
        { form: 'dish', depth: 120, inward: true },
        { form: 'torisphere', crown: 600, knuckle: 60 },
      ],
    });
    const { lines, view } = await sketchDesign(design([barrel]));
    expect(view).toBe('end');
    expect(lines.every(({ hidden }) => !hidden)).toBe(true);
    const round = lines.reduce((sum, line) => sum + lengthOf(line), 0);
    // 64 chords
    expect(Math.abs(round / (600 * Math.PI) - 1)).toBeLessThan(2e-3);
  });

  it('of a twisted hull from its bow has lines along keel, chines, sheer and stations only', async () => {
    const { lines, view } = await sketchDesign(design([hull]));
    expect(view).toBe('end');
    const seen = lines.filter(({ hidden }) => !hidden);
    const atKeel = seen.filter(
      ({ x1, y1, x2, y2 }) => Math.hypot(x1 - 300, y1) < 0.1 || Math.hypot(x2 - 300, y2) < 0.1,
    );
    // the stem, which rises 150, and the two sides of the transom
    expect(atKeel.map(lengthOf).sort((a, b) => a - b)).toEqual([
      expect.closeTo(150, 6),
      expect.closeTo(Math.hypot(250, 120), 6),
      expect.closeTo(Math.hypot(250, 120), 6),
    ]);
  });

  it('of a wheel arch goes round it in one run', async () => {
    const arch = cylinder('arch', 500, 300, {
      role: 'displaces',
      axis: 'y',
      at: [250, 250, -250],
    });
    const { lines } = await sketchDesign(design([box('body', [1000, 500, 350]), arch]));
    const hidden = lines.filter((line) => line.hidden);
    expect(hidden.length).toBeGreaterThan(20);
    hidden.slice(1).forEach(({ x1, y1 }, i) => {
      expect([x1, y1]).toEqual([hidden[i]!.x2, hidden[i]!.y2]);
    });
  });
});
