import { describe, expect, it } from 'vitest';
import { upVector } from '~/geometry/attitude';
import { horizontalAxes } from '~/geometry/horizontal-axes';
import { enclosedVolume, levels, shifted, type Mesh } from '~/geometry/mesh';
import { sweep } from '~/geometry/sweep';
import { opposite, unit, type Vec3 } from '~/geometry/vec3';
import { wetBelow } from '~/geometry/wet-below';
import { boxShape, cornerTetrahedron, cylinderShape, meshFrom } from './solids';

const up: Vec3 = [0, 0, 1];

function even(low: number, high: number, count: number): Float64Array {
  return Float64Array.from({ length: count }, (_, i) => low + ((high - low) * i) / (count - 1));
}

function ends(mesh: Mesh, direction: Vec3): readonly [number, number] {
  const z = levels(mesh, direction);
  return [z.reduce((a, b) => Math.min(a, b)), z.reduce((a, b) => Math.max(a, b))];
}

/** Volume below each level, every one on its own: Σ S·g(h), nothing carried from row to row. mm³ */
function oneByOne(mesh: Mesh, direction: Vec3, at: Float64Array): Float64Array {
  const z = levels(mesh, direction);
  const [e1, e2] = horizontalAxes(direction);
  const [a, b] = [levels(mesh, e1), levels(mesh, e2)];
  return at.map((h) => {
    let sum = 0;
    for (let n = 0; n < mesh.triangles.length; n += 3) {
      const [i, j, k] = [0, 1, 2].map((c) => mesh.triangles[n + c]!) as [number, number, number];
      const s = -0.5 * ((a[j]! - a[i]!) * (b[k]! - b[i]!) - (b[j]! - b[i]!) * (a[k]! - a[i]!));
      sum += s * wetBelow(h, z[i]!, z[j]!, z[k]!);
    }
    return sum;
  });
}

/** A pipe of 3 m with a wall of 1 mm: long thin triangles, each across hundreds of rows. */
const shell = meshFrom(
  [cylinderShape(60, 3000, 48, { axis: 'x' })],
  [cylinderShape(59, 3200, 48, { axis: 'x', at: [-100, 1, 1] })],
);
const sheet = meshFrom([boxShape([3000, 2, 1500])]);

describe('carried from row to row', () => {
  it.each([
    ['a thin shell', shell, 2_000],
    ['a thin sheet', sheet, 20_000],
    ['a thin sheet, few rows', sheet, 40],
  ])('%s, tilted, does not blow up', (_, mesh, rows) => {
    const whole = enclosedVolume(mesh);
    for (const direction of [upVector(31, 17), upVector(0.02, -0.01), upVector(-58, 44)]) {
      const [low, high] = ends(mesh, direction);
      const at = even(low, high, rows);
      const { volume } = sweep(mesh, direction, at);
      const exact = oneByOne(mesh, direction, at);
      let worst = 0;
      // the last row is seen from below, so a level corner there is none of it
      for (let row = 0; row < rows - 1; row += 1) {
        worst = Math.max(worst, Math.abs(volume[row]! - exact[row]!));
      }
      expect(worst / whole).toBeLessThan(1e-12);
      expect(Math.abs(volume[rows - 1]! - whole) / whole).toBeLessThan(1e-9);
    }
  });

  it('twenty thousand rows rise, row by row, to the volume of the mesh', () => {
    const mesh = meshFrom(
      [boxShape([900, 500, 300]), cylinderShape(200, 700, 64, { axis: 'z', at: [600, 50, 100] })],
      [boxShape([300, 300, 200], [100, 100, -50], [0, 20, 30])],
    );
    const direction = upVector(6, -4);
    const [low, high] = ends(mesh, direction);
    const { volume, surface } = sweep(mesh, direction, even(low, high, 20_000));
    const whole = enclosedVolume(mesh);
    for (let row = 1; row < 20_000; row += 1) {
      if (volume[row]! - volume[row - 1]! < -1e-12 * whole) expect.fail(`falls at row ${row}`);
      if (!(surface[row]! > -1e-6)) expect.fail(`surface ${surface[row]} at row ${row}`);
    }
    expect(volume[19_999]! / whole).toBeCloseTo(1, 12);
  });
});

describe('near empty and near the brim', () => {
  // edges of 300, 400, 500 along the axes: below h the volume is that of a corner with edges h√3
  const tip = cornerTetrahedron(300, 400, 500);
  const direction = unit([1, 1, 1]);

  it('the first drops keep their digits, and none is negative beyond 1e-9 mm³', () => {
    const at = Float64Array.of(0, 1e-6, 1e-4, 1e-2, 1, 100, 288);
    const { volume } = sweep(tip, direction, at);
    for (const drop of volume) expect(drop).toBeGreaterThan(-1e-9);
    [1e-4, 1e-2, 1, 100].forEach((h, i) => {
      expect(volume[i + 2]! / ((h * Math.sqrt(3)) ** 3 / 6)).toBeCloseTo(1, 9);
    });
    const tilted = meshFrom([boxShape([900, 500, 300], [0, 0, 0], [12, 7, 0])]);
    const [low, high] = ends(tilted, up);
    const drops = sweep(tilted, up, Float64Array.of(low, low + 1e-9, low + 1e-6, high)).volume;
    for (const drop of drops) expect(drop).toBeGreaterThan(-1e-9);
  });

  it('the room left is exact when it is swept from above, where the difference has lost its digits', () => {
    // the same tank on its head: its tip is the last to fill
    const head = opposite(direction);
    const [low, high] = ends(tip, head);
    const whole = enclosedVolume(tip);
    for (const left of [1e-3, 1e-1, 10]) {
      const exact = (left * Math.sqrt(3)) ** 3 / 6;
      const fromAbove = sweep(tip, opposite(head), Float64Array.of(-high + left, -low)).volume[0]!;
      expect(fromAbove / exact).toBeCloseTo(1, 9);
      const difference = whole - sweep(tip, head, Float64Array.of(high - left, high)).volume[0]!;
      expect(Math.abs(difference - fromAbove)).toBeLessThan(1e-13 * whole);
    }
  });
});

describe('where division would fail', () => {
  it('no corner need differ in level: stairs, slivers and triangles of no area are finite', () => {
    const stairs = meshFrom([
      boxShape([400, 400, 100]),
      boxShape([300, 400, 100], [100, 0, 100]),
      boxShape([100, 400, 1e-3], [300, 0, 200]),
    ]);
    const flat: Mesh = {
      positions: Float64Array.from([...stairs.positions, 50, 50, 50, 60, 60, 50, 70, 70, 50]),
      triangles: Uint32Array.from(
        [...stairs.triangles, 0, 1, 2].map((v, i, all) =>
          i < all.length - 3 ? v : stairs.positions.length / 3 + v,
        ),
      ),
    };
    const at = Float64Array.of(0, 50, 100, 100 + 1e-12, 200, 200.0005, 200.001);
    const { volume, surface, moments } = sweep(flat, up, at);
    for (const column of [volume, surface, ...moments]) {
      expect(column.every(Number.isFinite)).toBe(true);
    }
    [0, 8e6, 16e6].forEach((expected, row) => expect(volume[row]).toBeCloseTo(expected, 3));
    expect(volume[4]).toBeCloseTo(28e6, 3);
    expect(surface[1]).toBeCloseTo(160_000, 6);
    expect(surface[2]).toBeCloseTo(120_000, 6);
  });
});

describe('a tank of two parts', () => {
  it('holds what its parts hold, wherever it is cut', () => {
    const body = [
      boxShape([900, 500, 300]),
      cylinderShape(120, 500, 32, { axis: 'x', at: [-200, 130, 20] }),
    ];
    const whole = meshFrom(body);
    const direction = upVector(9, -5);
    const [low, high] = ends(whole, direction);
    const at = even(low - 1, high + 1, 57);
    const all = sweep(whole, direction, at);
    for (const cut of [-150, 0, 250, 611.3]) {
      const beyond = boxShape([2000, 2000, 2000], [cut, -700, -800]);
      const before = boxShape([2000, 2000, 2000], [cut - 2000, -700, -800]);
      const left = sweep(meshFrom(body, [beyond]), direction, at);
      const right = sweep(meshFrom(body, [before]), direction, at);
      at.forEach((_, row) => {
        const sum = left.volume[row]! + right.volume[row]!;
        expect(Math.abs(sum - all.volume[row]!)).toBeLessThan(1e-9 * enclosedVolume(whole));
        [0, 1, 2].forEach((axis) => {
          const moment = left.moments[axis]![row]! + right.moments[axis]![row]!;
          const gap = Math.abs(moment - all.moments[axis]![row]!);
          expect(gap).toBeLessThan(1e-9 * enclosedVolume(whole) * 1000);
        });
      });
    }
  });
});

describe('the free surface', () => {
  it('is how fast the volume rises', () => {
    const mesh = meshFrom(
      [cylinderShape(300, 900, 48, { axis: 'y' }), boxShape([700, 500, 300], [-50, 100, 250])],
      [boxShape([120, 950, 200], [200, -20, 100], [0, 15, 0])],
    );
    const direction = upVector(12, 7);
    const [low, high] = ends(mesh, direction);
    const step = 1e-3;
    for (let part = 0.05; part < 1; part += 0.1) {
      const h = low + part * (high - low);
      const { volume, surface } = sweep(
        mesh,
        direction,
        Float64Array.of(h - step, h, h + step, high),
      );
      expect((volume[2]! - volume[0]!) / (2 * step) / surface[1]!).toBeCloseTo(1, 5);
    }
  });
});

describe('the centroid', () => {
  it('of a part-filled lying cylinder: 2/3 (r² − d²)^(3/2) over the area of the segment, d off the centre', () => {
    const [r, length] = [300, 900];
    const mesh = meshFrom([cylinderShape(r, length, 512, { axis: 'x' })]);
    for (const h of [60, 170, 300, 430]) {
      const d = r - h;
      const area = r * r * Math.acos(d / r) - d * Math.sqrt(r * r - d * d);
      const { volume, moments } = sweep(mesh, up, Float64Array.of(h, 600));
      const below = (2 / 3) * (r * r - d * d) ** 1.5;
      // converges as facets⁻²
      expect(moments[2][0]! / volume[0]!).toBeCloseTo(r - below / area, 1);
      expect(moments[0][0]! / volume[0]!).toBeCloseTo(length / 2, 6);
      expect(moments[1][0]! / volume[0]!).toBeCloseTo(r, 6);
    }
  });
});

describe('far from the origin', () => {
  it('twenty metres cost nothing that shows', () => {
    const mesh = meshFrom([boxShape([900, 500, 300]), boxShape([200, 200, 200], [800, 100, 250])]);
    const away = shifted(mesh, [20_000, -20_000, 20_000]);
    const direction = upVector(11, 8);
    const [low, high] = ends(mesh, direction);
    const [lowAway, highAway] = ends(away, direction);
    const here = sweep(mesh, direction, even(low, high, 101)).volume;
    const there = sweep(away, direction, even(lowAway, highAway, 101)).volume;
    here.forEach((volume, row) => {
      expect(Math.abs(volume - there[row]!)).toBeLessThan(1e-11 * enclosedVolume(mesh));
    });
  });
});
