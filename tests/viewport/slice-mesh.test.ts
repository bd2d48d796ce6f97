import { describe, expect, it } from 'vitest';
import type { TankMesh } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';
import { facesBetween, surfaceLoops } from '~/viewport/slice-mesh';

/** The unit cube × 100, outward. */
const cube: TankMesh = {
  positions: Float64Array.from([
    0, 0, 0, 100, 0, 0, 100, 100, 0, 0, 100, 0, 0, 0, 100, 100, 0, 100, 100, 100, 100, 0, 100, 100,
  ]),
  triangles: Uint32Array.from([
    0, 2, 1, 0, 3, 2, 4, 5, 6, 4, 6, 7, 0, 1, 5, 0, 5, 4, 1, 2, 6, 1, 6, 5, 2, 3, 7, 2, 7, 6, 3, 0,
    4, 3, 4, 7,
  ]),
};
const up: Vec3 = [0, 0, 1];

function areaOf(loop: readonly Vec3[]): number {
  return Math.abs(
    loop.reduce((sum, [x, y], i) => {
      const [nx, ny] = loop[(i + 1) % loop.length]!;
      return sum + (x * ny - nx * y) / 2;
    }, 0),
  );
}

describe('a mesh cut by a level', () => {
  it.each([0.001, 25, 99.9])('gives one closed surface of 100 × 100 at %s mm', (level) => {
    const loops = surfaceLoops(cube, up, level);
    expect(loops).toHaveLength(1);
    expect(areaOf(loops[0]!)).toBeCloseTo(10_000, 6);
  });

  it('gives no surface below the floor or above the roof', () => {
    expect(surfaceLoops(cube, up, -1)).toEqual([]);
    expect(surfaceLoops(cube, up, 101)).toEqual([]);
  });

  it('cuts the walls between two levels and nothing else', () => {
    const area = facesBetween(cube, up, 20, 50).reduce((sum, polygon) => sum + area3(polygon), 0);
    expect(area).toBeCloseTo(4 * 100 * 30, 6);
    expect(facesBetween(cube, up, -Infinity, Infinity)).toHaveLength(12);
  });
});

function area3(polygon: readonly Vec3[]): number {
  const [a] = polygon;
  let sum = 0;
  for (let i = 1; i + 1 < polygon.length; i += 1) {
    const u = polygon[i]!.map((v, k) => v - a![k]!);
    const v = polygon[i + 1]!.map((w, k) => w - a![k]!);
    sum +=
      Math.hypot(
        u[1]! * v[2]! - u[2]! * v[1]!,
        u[2]! * v[0]! - u[0]! * v[2]!,
        u[0]! * v[1]! - u[1]! * v[0]!,
      ) / 2;
  }
  return sum;
}
