import { describe, expect, it } from 'vitest';
import { parseDesign } from '~/domain/tank/parse-design';
import { placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { cutCaps } from '~/geometry/cut-caps';
import { loadManifold, spaceOf } from '~/geometry/manifold';
import { enclosedVolume, type Mesh } from '~/geometry/mesh';
import type { PlacedShape } from '~/geometry/placed-shape';
import { revolvedMesh } from '~/geometry/revolved-mesh';
import { shells } from '~/geometry/shells';
import { sweep } from '~/geometry/sweep';
import { benchDesigns } from '../bench/bench-designs';

await loadManifold();

const shapes = (solids: readonly unknown[], facets = 64) => {
  const design = parseDesign({ format: 'dipwright-tank', version: 1, name: 'it', solids });
  const of = (role: string) =>
    design.solids
      .filter((solid) => solid.role === role)
      .map((solid) => placedShape(placedSolid(solid), facets));
  return { holds: of('holds'), displaces: of('displaces') };
};

/** The same shapes as meshes, which nothing is ever cut off. */
const asMeshes = (list: readonly PlacedShape[]): PlacedShape[] =>
  list.map(({ shape, place }) =>
    shape.form === 'revolution'
      ? { shape: { form: 'mesh', mesh: revolvedMesh(shape) }, place }
      : { shape, place },
  );

function isClosed({ triangles }: Mesh): boolean {
  const met = new Set<string>();
  for (let n = 0; n < triangles.length; n += 1) {
    const from = triangles[n]!;
    const to = triangles[n % 3 === 2 ? n - 2 : n + 1]!;
    if (!met.delete(`${to} ${from}`)) met.add(`${from} ${to}`);
  }
  return met.size === 0;
}

/** The space with caps cut off and glued on again against the space of whole solids. */
function agrees({ holds, displaces }: ReturnType<typeof shapes>): void {
  const origin = [100, -50, 20] as const;
  const quick = spaceOf(holds, displaces, origin);
  const whole = spaceOf(asMeshes(holds), asMeshes(displaces), origin);
  expect(isClosed(quick)).toBe(true);
  expect(shells(quick)).toHaveLength(shells(whole).length);
  expect(quick.triangles.length).toBeLessThanOrEqual(whole.triangles.length * 1.01);
  const volume = enclosedVolume(whole);
  expect(Math.abs(enclosedVolume(quick) / volume - 1)).toBeLessThan(1e-12);
  const up = [0.1, 0.2, Math.sqrt(0.95)] as const;
  const levels = Float64Array.from({ length: 60 }, (_, i) => -900 + 30 * i);
  const [one, other] = [quick, whole].map((mesh) => sweep(mesh, up, levels).volume);
  one!.forEach((value, i) => expect(Math.abs(value - other![i]!) / volume).toBeLessThan(1e-12));
}

const end = { form: 'torisphere', crown: 500, knuckle: 50 };
const barrel = {
  id: 'barrel',
  role: 'holds',
  kind: 'cylinder',
  diameter: 500,
  length: 1000,
  ends: [end, { form: 'ellipsoid', depth: 125 }],
};

describe('caps that stand clear of all else', () => {
  it('are cut off, and glued on again where they hold', () => {
    const dome = {
      id: 'dome',
      role: 'holds',
      kind: 'box',
      length: 200,
      width: 200,
      height: 200,
      at: [400, 150, 400],
    };
    const both = shapes([barrel, dome]);
    const cut = cutCaps(both.holds, both.displaces)!;
    expect(cut.caps).toHaveLength(2);
    agrees(both);
    agrees(
      shapes([
        { ...barrel, turn: [12, 33, -70] },
        { ...dome, at: [400, 150, 200] },
      ]),
    );
  });

  it('are cut off only as far as nothing stands in them', () => {
    const atTheEnd = {
      id: 'pipe',
      role: 'displaces',
      kind: 'cylinder',
      diameter: 60,
      length: 300,
      axis: 'z',
      at: [30, 220, 100],
    };
    const both = shapes([barrel, atTheEnd]);
    const [tip, far] = cutCaps(both.holds, both.displaces)!.caps;
    // the pipe stands from x 30 on, the low end reaches to about x 97
    const tipEnds = tip!.profile.at(-1)![1] - tip!.profile[0]![1];
    expect(tipEnds).toBeGreaterThan(20);
    expect(tipEnds).toBeLessThan(30);
    // all of the barrel beyond the pipe goes with its high end
    expect(far!.profile.at(-1)![1] - far!.profile[0]![1]).toBeCloseTo(1125, 9);
    agrees(both);
  });

  it('stay where something only just reaches them, and where an end is turned inward', () => {
    const flush = {
      id: 'bulkhead',
      role: 'displaces',
      kind: 'box',
      length: 1000,
      width: 10,
      height: 500,
      at: [97, 240, 0],
    };
    const inward = {
      ...barrel,
      ends: [
        { form: 'dish', depth: 90, inward: true },
        { ...end, inward: true },
      ],
    };
    const box = {
      id: 'box',
      role: 'holds',
      kind: 'box',
      length: 200,
      width: 200,
      height: 200,
      at: [400, 150, 400],
    };
    agrees(shapes([barrel, flush]));
    const turned = shapes([inward, box]);
    expect(cutCaps(turned.holds, turned.displaces)).toBe(null);
    agrees(turned);
  });

  it('of what displaces are left off for good', () => {
    const float = {
      id: 'float',
      role: 'displaces',
      kind: 'sphere',
      diameter: 400,
      at: [800, 50, 50],
    };
    const box = { id: 'box', role: 'holds', kind: 'box', length: 1000, width: 500, height: 500 };
    const both = shapes([box, float]);
    expect(cutCaps(both.holds, both.displaces)).toBe(null);
    const lying = { ...barrel, role: 'displaces', at: [600, 0, 0] };
    const across = shapes([box, lying]);
    expect(cutCaps(across.holds, across.displaces)).toMatchObject({ caps: [] });
    agrees(across);
  });

  it('of balls, stretched ones and cones', () => {
    const box = {
      id: 'box',
      role: 'holds',
      kind: 'box',
      length: 300,
      width: 300,
      height: 90,
      at: [100, 100, 255],
    };
    agrees(shapes([{ id: 'ball', role: 'holds', kind: 'sphere', diameter: 600 }, box]));
    agrees(
      shapes([
        { id: 'egg', role: 'holds', kind: 'ellipsoid', length: 700, width: 500, height: 600 },
        box,
      ]),
    );
    agrees(
      shapes([{ id: 'cone', role: 'holds', kind: 'cone', start: 0, end: 500, length: 600 }, box]),
    );
  });

  it('of the six solids of the bench', () => {
    const { solids } = benchDesigns['six solids with formed ends, tilted']!;
    const six = shapes(solids);
    expect(cutCaps(six.holds, six.displaces)!.caps.length).toBeGreaterThanOrEqual(4);
    agrees(six);
  });
});
