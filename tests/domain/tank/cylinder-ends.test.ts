import { describe, expect, it } from 'vitest';
import { DipwrightError } from '~/domain/errors';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computeTable } from '~/domain/table/compute-table';
import { facetStandOffMm } from '~/domain/table/facet-stand-off';
import { cylinder as kind } from '~/domain/tank/kinds/cylinder/cylinder';
import type { Cylinder, End } from '~/domain/tank/kinds/cylinder/schema';
import { parseDesign } from '~/domain/tank/parse-design';
import { highestLevel, placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { areaPreservingFactor } from '~/geometry/circle';
import { headDepth } from '~/geometry/head';
import { headHeight } from '~/geometry/head-height';
import { loadManifold, meshOf } from '~/geometry/manifold';
import { box, cylinder, design } from '../table/designs';
import { cylindersWithEnds } from './cylinders-with-ends';

await loadManifold();

const flat: End = { form: 'flat' };
const dish = (depth: number, inward?: boolean): End => ({
  form: 'dish',
  depth,
  ...(inward ? { inward } : {}),
});
const cone = (depth: number, inward?: boolean): End => ({
  form: 'cone',
  depth,
  ...(inward ? { inward } : {}),
});

/** A barrel 500 × 1000 with two ends. */
function barrel(ends: readonly [End, End], rest: Partial<Cylinder> = {}) {
  return cylinder('vat', 500, 1000, { ends: [...ends], ...rest });
}

async function faultsOf(run: () => unknown) {
  try {
    await run();
  } catch (error) {
    if (!(error instanceof DipwrightError)) throw error;
    return error.faults.map(({ pointer, detail }) => [pointer, detail]);
  }
  throw new Error('was not refused');
}

describe('ends that contradict something are refused by name', () => {
  it.each<[string, readonly [End, End], string, string]>([
    [
      'a dish deeper than a hemisphere',
      [flat, dish(251)],
      '/solids/0/ends/1/depth',
      `Solid "vat", ends, number 2, depth: a dish is at most as deep as the barrel's radius, 250 mm: beyond it, take "ellipsoid".`,
    ],
    [
      'a crown less than the radius',
      [{ form: 'torisphere', crown: 249, knuckle: 40 }, flat],
      '/solids/0/ends/0/crown',
      `Solid "vat", ends, number 1, crown: the crown is at least the barrel's radius, 250 mm.`,
    ],
    [
      'a knuckle as large as the radius',
      [{ form: 'torisphere', crown: 500, knuckle: 250 }, flat],
      '/solids/0/ends/0/knuckle',
      `Solid "vat", ends, number 1, knuckle: the knuckle is less than the barrel's radius, 250 mm.`,
    ],
    [
      'a flat end turned inward',
      [flat, { form: 'flat', inward: true }],
      '/solids/0/ends/1/inward',
      'Solid "vat", ends, number 2, inward: a flat end has no depth to turn inward: leave "inward" out.',
    ],
    [
      'a depth of nothing',
      [cone(0.009), flat],
      '/solids/0/ends/0/depth',
      'Solid "vat", ends, number 1, depth: a size is at least 0.01 mm.',
    ],
    [
      'ends turned inward until they meet',
      [cone(800, true), dish(200, true)],
      '/solids/0/ends',
      'Solid "vat", ends: turned inward, the ends meet: their depths, 800 and 200 mm, add up to less than the length, 1000 mm.',
    ],
    [
      'an end turned inward that reaches a flat one',
      [cone(1000, true), flat],
      '/solids/0/ends/0',
      'Solid "vat", ends, number 1: turned inward, it reaches the other end: its depth, 1000 mm, is less than the length, 1000 mm.',
    ],
    [
      'an end turned inward that comes through the tip of one that stands out',
      [dish(60), { form: 'ellipsoid', depth: 1061, inward: true }],
      '/solids/0/ends/1',
      'Solid "vat", ends, number 2: turned inward, it reaches the other end on the axis: make it less deep, or the length 1001.1 mm or more.',
    ],
    [
      'an end turned inward that comes through the flank of one that stands out',
      // over a cone of 1400, a spheroid of 2000 is clear at the tip of neither: 1000 + 1400(1 − x) − 2000√(1 − x²)
      // is least at x = 0.7/√1.49 where it is 2400 − √(2000² + 1400²) = −41.31
      [{ form: 'ellipsoid', depth: 2000, inward: true }, cone(1400)],
      '/solids/0/ends/0',
      'Solid "vat", ends, number 1: turned inward, it reaches the other end 143 mm off the axis: make it less deep, or the length 1041.4 mm or more.',
    ],
  ])('%s', async (_, ends, pointer, sentence) => {
    const tank = design([barrel(ends)]);
    expect(parseDesign(tank)).toEqual(tank);
    expect(await faultsOf(() => computeTable(tank, { stepMm: 100 }))).toEqual([
      [pointer, sentence],
    ]);
  });

  it('each of several', async () => {
    const ends: [End, End] = [dish(300), { form: 'torisphere', crown: 100, knuckle: 260 }];
    const faults = await faultsOf(() => computeTable(design([barrel(ends)]), { stepMm: 100 }));
    expect(faults.map(([pointer]) => pointer)).toEqual([
      '/solids/0/ends/0/depth',
      '/solids/0/ends/1/crown',
      '/solids/0/ends/1/knuckle',
    ]);
    const small: Cylinder = { ...(barrel([flat, flat]) as Cylinder) };
    small.ends = [flat, { form: 'torisphere', crown: 100, knuckle: 120 }];
    expect(kind.faults(small).map(({ detail }) => detail)).toEqual([
      "the crown is at least the barrel's radius, 250 mm.",
      'the knuckle is at most the crown, 100 mm.',
    ]);
  });

  it.each([
    [{ form: 'domed', depth: 3 }, '/solids/0/ends/0/form', 'the form of an end is'],
    [{ form: 'dish' }, '/solids/0/ends/0/depth', 'this field is missing.'],
    [{ form: 'dish', depth: 0 }, '/solids/0/ends/0/depth', 'a length is more than 0 mm.'],
    [{ form: 'flat', depth: 10 }, '/solids/0/ends/0/depth', 'there is no such field here.'],
    [{ form: 'cone', depth: 9, inward: 1 }, '/solids/0/ends/0/inward', 'is true or false.'],
  ])('what is no end: %j', async (end, pointer, words) => {
    const tank = design([{ ...barrel([flat, flat]), ends: [end, flat] } as never]);
    const faults = await faultsOf(() => parseDesign(tank));
    expect(faults).toHaveLength(1);
    expect(faults[0]![0]).toBe(pointer);
    expect(faults[0]![1]).toContain(words);
  });

  it('one end, or three', async () => {
    const refused = (ends: readonly End[]) =>
      faultsOf(() => parseDesign(design([{ ...barrel([flat, flat]), ends } as never])));
    expect(await refused([flat])).toEqual([
      ['/solids/0/ends/1', 'Solid "vat", ends, number 2: this field is missing.'],
    ]);
    expect(await refused([flat, flat, flat])).toEqual([
      ['/solids/0/ends', 'Solid "vat", ends: give two ends: the low one and the high one.'],
    ]);
  });
});

describe('ends in words and sizes', () => {
  it.each<[readonly [End, End] | undefined, string]>([
    [undefined, '⌀ 500 × 1000 along x'],
    [[flat, flat], '⌀ 500 × 1000 along x'],
    [[dish(125), dish(125)], '⌀ 500 × 1000 along x, dished ends 125'],
    [[cone(80, true), cone(80, true)], '⌀ 500 × 1000 along x, coned ends 80 inward'],
    [
      [flat, { form: 'torisphere', crown: 500, knuckle: 50 }],
      '⌀ 500 × 1000 along x, low end flat, high end torispherical 500 / 50',
    ],
    [
      [dish(80), { form: 'ellipsoid', depth: 125 }],
      '⌀ 500 × 1000 along x, low end dished 80, high end elliptical 125',
    ],
  ])('%j', (ends, words) => {
    const solid = cylinder('c', 500, 1000, ends ? { ends: [...ends] } : {}) as Cylinder;
    expect(kind.words(solid)).toBe(words);
  });

  it('each end has its own', () => {
    const ends: [End, End] = [dish(80), { form: 'torisphere', crown: 500, knuckle: 50 }];
    const sizes = kind.sizes(barrel(ends) as Cylinder);
    expect(sizes.map(({ path, label }) => `${path.join('/')} ${label}`)).toEqual([
      'diameter diameter',
      'length length',
      'ends/0/depth low end depth',
      'ends/1/crown high end crown',
      'ends/1/knuckle high end knuckle',
    ]);
  });

  it('make the solid longer by what stands out, not by what is turned inward', () => {
    expect(kind.extent(barrel([dish(80), cone(40, true)]) as Cylinder)).toEqual([1080, 500, 500]);
    const depth = headDepth({ form: 'torisphere', radius: 250, crown: 500, knuckle: 50 });
    const ends: [End, End] = [{ form: 'torisphere', crown: 500, knuckle: 50 }, cone(20)];
    expect(kind.extent(barrel(ends, { axis: 'z' }) as Cylinder)[2]).toBeCloseTo(1020 + depth, 9);
  });
});

describe('chords of a cylinder with ends', () => {
  const length = (
    solid: Cylinder,
    origin: readonly number[],
    direction: readonly number[],
    slack = 0,
  ) =>
    kind
      .chords(solid, { origin: origin as never, direction: direction as never }, slack)
      .map(({ from, to }) => [from, to]);

  it('run from tip to tip along the axis, and round what is turned inward', () => {
    const out = barrel([dish(80), cone(40)], { axis: 'z' }) as Cylinder;
    const [whole] = length(out, [0, 0, 0], [0, 0, 1]);
    expect(whole![0]).toBeCloseTo(-560, 8);
    expect(whole![1]).toBeCloseTo(560, 8);
    const turned = barrel([dish(80, true), cone(40)], { axis: 'z' }) as Cylinder;
    const [shorter] = length(turned, [0, 0, 0], [0, 0, 1]);
    expect(shorter![0]).toBeCloseTo(-520 + 80, 8);
    expect(shorter![1]).toBeCloseTo(520, 8);
    // across, through the dish: both sides of it, and no more
    const place = -520 + 30;
    const half = 250 * 250;
    const sphere = (half + 80 * 80) / 160;
    const r = Math.sqrt(sphere ** 2 - (sphere - 80 + 30) ** 2);
    const across = length(turned, [0, 0, place], [1, 0, 0]).flat();
    [-250, -r, r, 250].forEach((value, i) => expect(across[i]).toBeCloseTo(value, 7));
  });

  it('pass the seam between barrel and end, whatever the slack', () => {
    const solid = barrel([dish(80), cone(40)], { axis: 'z' }) as Cylinder;
    for (const slack of [-2e-6, 0, 2e-6]) {
      for (const seam of [-560 + 80, 560 - 40]) {
        const [from, to] = length(solid, [0, 0, seam], [0, 1, 0], slack).flat();
        expect(from).toBeCloseTo(-250, 9);
        expect(to).toBeCloseTo(250, 9);
      }
    }
  });

  it('count a line along the wall or a cone as inside or as outside, as asked', () => {
    const solid = barrel([cone(250, true), flat], { axis: 'z' }) as Cylinder;
    const along = (slack: number) => length(solid, [250, 0, 0], [0, 0, 1], slack);
    expect(along(2e-6).flat()).toEqual([-500, 500]);
    expect(along(-2e-6)).toEqual([]);
    // a generator of the cone, at 45°: from its rim to its tip along the surface, then on into the liquid
    const s = Math.SQRT1_2;
    const generator = (slack: number) =>
      length(solid, [250, 0, -500], [-s, 0, s], slack).reduce((sum, [a, b]) => sum + b! - a!, 0);
    const whole = 500 / s;
    expect(generator(2e-6)).toBeCloseTo(whole, 4);
    expect(generator(-2e-6)).toBeCloseTo(whole / 2, 4);
  });
});

/** Barrels of no length to speak of: only their ends tell how wide they are. */
const short = [
  { form: 'torisphere', crown: 90_000, knuckle: 20 },
  { form: 'torisphere', crown: 201, knuckle: 24 },
  { form: 'torisphere', crown: 2000, knuckle: 25 },
  { form: 'torisphere', crown: 400, knuckle: 26 },
  { form: 'ellipsoid', depth: 310 },
  { form: 'dish', depth: 0.5 },
].map((end) => cylinder('it', 400, 1, { ends: [end as End, end as End] }));

describe('meshes of cylinders with ends', () => {
  it.each(
    [...cylindersWithEnds, ...short].map(
      (solid) => [kind.words(solid as Cylinder), solid] as const,
    ),
  )('%s stand off their surface by no more than is reckoned with', (_, solid) => {
    for (const facets of [32, 64, 128]) {
      const placed = placedSolid({ ...solid, axis: 'z' } as Cylinder);
      const bound = facetStandOffMm(placed, facets);
      const { shape } = placedShape(placed, facets);
      if (shape.form !== 'revolution') continue;
      const factor = areaPreservingFactor(facets);
      let worst = 0;
      const { ends, diameter } = solid as Cylinder;
      const [low, high] = ends!;
      const radius = diameter / 2;
      const middle = (outwardDepth(low, radius) - outwardDepth(high, radius)) / 2;
      for (const [r, z] of shape.profile) {
        worst = Math.max(worst, offSurface(r * factor, z - middle, solid as Cylinder));
      }
      expect(worst).toBeLessThan(bound);
    }
  });

  it('a hemispherical end has the facets of a ball of its radius', () => {
    const hemisphere = placedSolid(barrel([dish(250), dish(250)], { axis: 'z' }));
    const ball = placedSolid({ id: 'b', role: 'holds', kind: 'sphere', diameter: 500 });
    const angles = (placed: typeof ball) => {
      const { positions } = meshOf(placedShape(placed, 64), [0, 0, 0]);
      const found = new Set<string>();
      for (let i = 0; i < positions.length; i += 3) {
        const [x, y] = [positions[i]! - 250, positions[i + 1]! - 250];
        if (Math.hypot(x, y) > 1) found.add((Math.atan2(y, x) + 1e-9).toFixed(6));
      }
      return [...found].sort();
    };
    expect(angles(hemisphere)).toEqual(angles(ball));
  });

  it('have their support where closed form puts it', () => {
    // a spheroid 125 deep under a barrel of 250 radius, leaning 30°: √((250 sin)² + (125 cos)²) below its mouth
    const placed = placedSolid(barrel([{ form: 'ellipsoid', depth: 125 }, flat], { axis: 'z' }));
    const [s, c] = [0.5, Math.sqrt(3) / 2];
    const support = highestLevel(placed, [s, 0, -c]);
    expect(support).toBeCloseTo(s * 250 - c * 125 + Math.hypot(250 * s, 125 * c), 9);
  });
});

function outwardDepth(end: End, radius: number): number {
  return end.inward ? 0 : headDepth({ ...end, radius });
}

/** How far a point lies off the surface of a cylinder along z with its barrel's middle at the origin, mm. */
function offSurface(r: number, z: number, { diameter, length, ends }: Cylinder): number {
  const radius = diameter / 2;
  const [low, high] = ends!;
  const distances = [Math.abs(z) <= length / 2 + 2 ? Math.abs(r - radius) : Infinity];
  for (const [end, mouth, side] of [
    [low, -length / 2, -1],
    [high, length / 2, 1],
  ] as const) {
    const towards = end.inward ? -side : side;
    const height = towards * (z - mouth);
    const head = { ...end, radius };
    const distance = (t: number) => {
      const at = radius * Math.sin((t * Math.PI) / 2);
      return Math.hypot(r - at, height - headHeight(head, at));
    };
    // the nearest of many points of the half outline, then narrowed down
    let nearest = 0;
    for (let i = 1; i <= 500; i += 1) if (distance(i / 500) < distance(nearest)) nearest = i / 500;
    let [from, to] = [Math.max(nearest - 1 / 500, 0), Math.min(nearest + 1 / 500, 1)];
    for (let round = 0; round < 60; round += 1) {
      const third = (to - from) / 3;
      if (distance(from + third) < distance(to - third)) to -= third;
      else from += third;
    }
    distances.push(distance((from + to) / 2));
  }
  return Math.min(...distances);
}

describe('tanks with ends may be issued', () => {
  it.each<[string, readonly [End, End]]>([
    ['dished', [dish(125), dish(125)]],
    ['pushed in', [dish(125, true), flat]],
    [
      'pushed in so that they meet the wall in a cusp',
      [
        { form: 'ellipsoid', depth: 125, inward: true },
        { form: 'torisphere', crown: 500, knuckle: 50, inward: true },
      ],
    ],
    ['coned', [cone(125, true), cone(60)]],
    [
      'all pushed one way',
      [
        { form: 'ellipsoid', depth: 400, inward: true },
        { form: 'ellipsoid', depth: 300 },
      ],
    ],
  ])('%s', async (_, ends) => {
    expect(await checkIssuable(design([barrel(ends)]))).toEqual([]);
  });

  it('but not where a tip only touches what it should join', async () => {
    const touching = design([
      barrel([dish(125), flat], { axis: 'x', at: [500, 0, 0] }),
      box('chest', [500, 500, 500]),
    ]);
    expect((await checkIssuable(touching))[0]).toMatch(/in 2 pieces/);
    const joined = design([
      barrel([dish(125), flat], { axis: 'x', at: [460, 0, 0] }),
      box('chest', [500, 500, 500]),
    ]);
    expect(await checkIssuable(joined)).toEqual([]);
  });
});
