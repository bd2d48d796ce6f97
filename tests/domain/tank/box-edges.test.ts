import { describe, expect, it } from 'vitest';
import type { DipwrightError } from '~/domain/errors';
import { checkIssuable } from '~/domain/table/check-issuable';
import { computeTable } from '~/domain/table/compute-table';
import { box as boxKind } from '~/domain/tank/kinds/box/box';
import type { Box } from '~/domain/tank/kinds/box/schema';
import type { Solid } from '~/domain/tank/kinds/registry';
import { parseDesign } from '~/domain/tank/parse-design';
import { placedShape, placedSolid } from '~/domain/tank/placed-solid';
import { loadManifold, meshOf } from '~/geometry/manifold';
import { enclosedVolume, type Mesh } from '~/geometry/mesh';
import { sweep } from '~/geometry/sweep';
import { upVector } from '~/geometry/attitude';
import { box, cylinder, design } from '../table/designs';

await loadManifold();

const [length, width, height] = [600, 400, 300];

function rounded(edges: Box['edges'], rest: Partial<Box> = {}): Box {
  return { id: 'b', role: 'holds', kind: 'box', length, width, height, edges, ...rest };
}

function meshAt(solid: Solid, facets: number): Mesh {
  return meshOf(placedShape(placedSolid(solid), facets), [0, 0, 0]);
}

describe('volume of a box with rounded edges', () => {
  it('loses (4 − π) r² along four edges of one direction', () => {
    const lost = (4 - Math.PI) * 50 ** 2;
    expect(boxKind.volume(rounded({ x: 50 }))).toBeCloseTo(72e6 - lost * length, 5);
    expect(boxKind.volume(rounded({ y: 50 }))).toBeCloseTo(72e6 - lost * width, 5);
    expect(boxKind.volume(rounded({ z: 50 }))).toBeCloseTo(72e6 - lost * height, 5);
  });

  it('with ball corners: what is left between them, the quarter cylinders and the ball', () => {
    const r = 60;
    const [a, b, c] = [length - 2 * r, width - 2 * r, height - 2 * r];
    const parts =
      a * b * c +
      2 * r * (a * b + b * c + c * a) +
      Math.PI * r * r * (a + b + c) +
      (4 / 3) * Math.PI * r ** 3;
    expect(boxKind.volume(rounded({ x: r, y: r, z: r }))).toBeCloseTo(parts, 5);
  });

  it('is the ball when nothing flat is left', () => {
    const ball = rounded({ x: 150, y: 150, z: 150 }, { length: 300, width: 300, height: 300 });
    expect(boxKind.volume(ball)).toBeCloseTo((4 / 3) * Math.PI * 150 ** 3, 6);
  });

  it('with rolled rims: the sum of its level sections', () => {
    const [R, r] = [120, 45];
    const section = (inset: number) =>
      (length - 2 * inset) * (width - 2 * inset) - (4 - Math.PI) * (R - inset) ** 2;
    // over the rim's height, inset = r (1 − cos φ) and the height rises by r cos φ dφ; Simpson's rule
    const n = 2000;
    let rim = 0;
    for (let i = 0; i <= n; i += 1) {
      const angle = (i / n) * (Math.PI / 2);
      const weight = i === 0 || i === n ? 1 : i % 2 === 1 ? 4 : 2;
      rim += weight * section(r * (1 - Math.cos(angle))) * r * Math.cos(angle);
    }
    rim *= Math.PI / 2 / n / 3;
    const whole = 2 * rim + section(0) * (height - 2 * r);
    expect(boxKind.volume(rounded({ x: r, y: r, z: R })) / whole).toBeCloseTo(1, 12);
  });

  it.each([
    [{ z: 50 }],
    [{ x: 150 }],
    [{ x: 40, y: 40, z: 120 }],
    [{ x: 150, y: 80, z: 80 }],
    [{ x: 60, y: 60, z: 60 }],
    [{ x: 150, y: 150, z: 200 }],
    [{ x: 0.01, y: 0.01, z: 200 }],
    [{ x: 0.01, y: 0.01, z: 0.01 }],
  ])(
    '%j: its mesh encloses it exactly, at 16 facets and at 256, and stays inside the box',
    (edges) => {
      const solid = rounded(edges);
      for (const facets of [16, 128, 256]) {
        const mesh = meshAt(solid, facets);
        expect(enclosedVolume(mesh, [300, 200, 150]) / boxKind.volume(solid)).toBeCloseTo(1, 8);
        [length, width, height].forEach((size, axis) => {
          const along = mesh.positions.filter((_, i) => i % 3 === axis);
          expect(Math.abs(Math.min(...along))).toBe(0);
          expect(Math.max(...along)).toBe(size);
        });
      }
    },
  );

  it('triangles have an area: no corner falls on another', () => {
    for (const edges of [
      { x: 60, y: 60, z: 60 },
      { x: 150, y: 150, z: 200 },
      { x: 40, y: 40, z: 120 },
    ]) {
      const { positions, triangles } = meshAt(rounded(edges), 256);
      const at = (n: number) => positions.subarray(3 * triangles[n]!, 3 * triangles[n]! + 3);
      let shortest = Infinity;
      for (let n = 0; n < triangles.length; n += 1) {
        const [p, q] = [at(n), at(n % 3 === 2 ? n - 2 : n + 1)];
        shortest = Math.min(shortest, Math.hypot(p[0]! - q[0]!, p[1]! - q[1]!, p[2]! - q[2]!));
      }
      expect(shortest).toBeGreaterThan(2e-6);
    }
  });
});

/** Area of a rounded rectangle w × h, corner radius r, below the height z over its foot. */
function rectangleBelow(w: number, h: number, r: number, z: number): number {
  if (z <= 0) return 0;
  if (z > h / 2) {
    return w * h - (4 - Math.PI) * r * r - (z >= h ? 0 : rectangleBelow(w, h, r, h - z));
  }
  const low = Math.min(z, r);
  const c = r - low;
  // two quarter circles up to `low`, and what stands between them
  const segment = r > 0 ? r * r * Math.acos(Math.min(c / r, 1)) - c * Math.sqrt(r * r - c * c) : 0;
  return segment + (w - 2 * r) * low + Math.max(z - r, 0) * w;
}

/** Gauss and Legendre's rule of five points over [from, to] in n parts (Abramowitz and Stegun, 25.4.30, from memory). */
function integral(f: (x: number) => number, from: number, to: number, n: number): number {
  const nodes = [0, 0.5384693101056831, -0.5384693101056831, 0.906179845938664, -0.906179845938664];
  const weights = [
    128 / 225,
    0.4786286704993665,
    0.4786286704993665,
    0.2369268850561891,
    0.2369268850561891,
  ];
  const half = (to - from) / n / 2;
  let sum = 0;
  for (let i = 0; i < n; i += 1) {
    nodes.forEach((node, k) => (sum += weights[k]! * f(from + half * (2 * i + 1 + node))));
  }
  return sum * half;
}

/** Litres of a box with ball corners below a surface that is `depth` over the floor at x = 0 and rises by tan per mm. */
function litresBelow(r: number, depth: number, tan: number): number {
  const slice = (x: number, inset: number) =>
    rectangleBelow(width - 2 * inset, height - 2 * inset, r - inset, depth + tan * x - inset);
  const middle = integral((x) => slice(x, 0), r, length - r, 4000);
  // in the rounded parts x = r (1 − cos φ): no root at the end
  const ends = integral(
    (angle) => {
      const [x, inset] = [r * (1 - Math.cos(angle)), r * (1 - Math.sin(angle))];
      return (slice(x, inset) + slice(length - x, inset)) * r * Math.sin(angle);
    },
    0,
    Math.PI / 2,
    4000,
  );
  return (middle + ends) / 1e6;
}

describe('a partly filled box with rounded edges', () => {
  const r = 60;
  const ballCorners = rounded({ x: r, y: r, z: r });

  it('has the whole volume in its quadrature: the check of the check', () => {
    expect(litresBelow(r, 1000, 0) / (boxKind.volume(ballCorners) / 1e6)).toBeCloseTo(1, 11);
  });

  it.each([0, 10, 35])(
    'agrees with quadrature, pitch %s°, within 1e-7 of capacity at 256',
    (pitch) => {
      const tan = Math.tan((pitch * Math.PI) / 180);
      const up = upVector(pitch, 0);
      const mesh = meshAt(ballCorners, 256);
      const volume = enclosedVolume(mesh, [300, 200, 150]);
      // level u·p of the surface whose depth at x = 0 is d: u = (−tan, 0, 1)·u_z
      const depths = Array.from(
        { length: 60 },
        (_, i) => -tan * length + ((i + 0.5) / 60) * (height + tan * length),
      );
      const swept = sweep(
        mesh,
        up,
        Float64Array.from(depths, (depth) => depth * up[2]),
      ).volume;
      let worst = 0;
      depths.forEach((depth, i) => {
        worst = Math.max(
          worst,
          Math.abs(swept[i]! / 1e6 - litresBelow(r, depth, tan)) / (volume / 1e6),
        );
      });
      expect(worst).toBeLessThan(1e-7);
    },
  );

  it('with rims smaller than its corners agrees with the sum of its sections within 1e-7', () => {
    const [R, rim] = [150, 50];
    const solid = rounded({ x: rim, y: rim, z: R });
    const mesh = meshAt(solid, 256);
    const section = (inset: number) =>
      (length - 2 * inset) * (width - 2 * inset) - (4 - Math.PI) * (R - inset) ** 2;
    const below = (z: number) => {
      const angle = Math.acos(1 - Math.min(z, rim) / rim);
      // from the floor up: z = rim (1 − cos φ), inset = rim (1 − sin φ)
      const rolled = integral(
        (a) => section(rim * (1 - Math.sin(a))) * rim * Math.sin(a),
        0,
        angle,
        50,
      );
      return rolled + section(0) * Math.max(z - rim, 0);
    };
    const depths = Float64Array.from({ length: 75 }, (_, i) => 2 * i + 1);
    sweep(mesh, [0, 0, 1], depths).volume.forEach((value, i) => {
      expect(Math.abs(value - below(depths[i]!)) / boxKind.volume(solid)).toBeLessThan(1e-7);
    });
  });

  it('rounded to the middle along one direction it is the cylinder, along three the ball', async () => {
    const atMm = [13, 77, 150, 240];
    const lying = rounded({ x: 150 }, { width: 300 });
    const [one, other] = [
      await computeTable(design([lying]), { atMm }),
      await computeTable(design([cylinder('c', 300, 600)]), { atMm }),
    ];
    one.rows.forEach(({ volumeL }, i) =>
      expect(Math.abs(volumeL - other.rows[i]!.volumeL) / other.capacityL).toBeLessThan(2e-8),
    );
    const ball = rounded({ x: 150, y: 150, z: 150 }, { length: 300, width: 300 });
    const table = await computeTable(design([ball]), { atMm });
    table.rows.forEach(({ depthMm: h, volumeL }) => {
      // spherical cap π h² (3R − h) / 3 (Weisstein, MathWorld "Spherical Cap", from memory)
      const cap = (Math.PI * h * h * (450 - h)) / 3 / 1e6;
      expect(Math.abs(volumeL - cap) / table.capacityL).toBeLessThan(2e-7);
    });
    expect(table.errorL / table.capacityL).toBeLessThan(2e-6);
  });

  it('lets a stick stand on a face, on the floor, and in a rounded corner', async () => {
    const at = async (x: number, y: number, edges: Box['edges']) =>
      (await computeTable(design([rounded(edges)], { stick: { at: [x, y] } }), { stepMm: 50 }))
        .heightMm;
    expect(await at(300, 200, { x: 50 })).toBe(300);
    expect(await at(300, 200, { x: 40, y: 40, z: 100 })).toBe(300);
    // in the end face, between the rounded edges
    expect(await at(0, 200, { x: 50 })).toBe(300);
    expect(await at(0, 200, { x: 40, y: 40, z: 100 })).toBeCloseTo(220, 2);
    // 20 mm in from the wall, the edge of 50 mm stands 50 − √(50² − 30²) = 10 mm over the floor
    expect(await at(300, 20, { x: 50 })).toBeCloseTo(280, 9);
    await expect(at(1, 1, { z: 50 })).rejects.toThrow('does not stand over the liquid space');
  });

  it('may stand flat on another solid, and is refused where it only touches along a round edge', async () => {
    const below = box('below', [600, 400, 200], { at: [0, 0, -200] });
    expect(await checkIssuable(design([rounded({ x: 40, y: 40, z: 40 }), below]))).toEqual([]);
    const lying = rounded({ x: 150 }, { width: 300 });
    expect((await checkIssuable(design([lying, below]))).join()).toMatch(/touches another|pieces/);
  });
});

describe('edges that cannot be are refused by name', () => {
  it.each<[Box['edges'], string, RegExp]>([
    [
      { x: 50, z: 40 },
      '/solids/0/edges',
      /^Solid "b", edges: at most one of the three radii is more than 0, or two/,
    ],
    [{ x: 50, z: 50 }, '/solids/0/edges', /two are equal and not larger than the third/],
    [{ x: 50, y: 50, z: 40 }, '/solids/0/edges', /as a ball rolls along the edges/],
    [{ x: 30, y: 40, z: 50 }, '/solids/0/edges', /all three equal: ball corners/],
    [
      { x: 151 },
      '/solids/0/edges/x',
      /^Solid "b", edges, x: a radius of 151 mm does not fit: it is at most half of the height, 150 mm/,
    ],
    [{ z: 201 }, '/solids/0/edges/z', /at most half of the width, 200 mm/],
    [{ z: -1 }, '/solids/0/edges/z', /a radius is 0 mm or more/],
    [{ z: 0.001 }, '/solids/0/edges/z', /a size is at least 0.01 mm/],
    [{ w: 1 } as Box['edges'], '/solids/0/edges/w', /there is no such field here/],
  ])('%j', async (edges, pointer, detail) => {
    let fault: unknown = null;
    try {
      await computeTable(parseDesign(design([rounded(edges)])), { stepMm: 50 });
    } catch (error) {
      fault = (error as DipwrightError).faults[0];
    }
    expect(fault).toEqual({ pointer, detail: expect.stringMatching(detail) as string });
  });

  it('all 0 is a sharp box', () => {
    expect(boxKind.faults(rounded({ x: 0, y: 0, z: 0 }))).toEqual([]);
    expect(boxKind.curved(rounded({ x: 0, z: 0 }))).toBe(false);
    expect(boxKind.volume(rounded({}))).toBe(72e6);
  });
});
