import { expect, it } from 'vitest';
import { boxNeighbours } from '~/geometry/box-neighbours';
import type { Mesh } from '~/geometry/mesh';
import { thinPlace } from '~/geometry/thin-places';
import type { Vec3 } from '~/geometry/vec3';

/** A plate of 1 m by 1 m with n × n squares on each face. */
function plate(n: number, thick: number): Mesh {
  const positions: number[] = [];
  for (const z of [0, thick]) {
    for (let i = 0; i <= n; i += 1) {
      for (let j = 0; j <= n; j += 1) positions.push((1000 * i) / n, (1000 * j) / n, z);
    }
  }
  const at = (i: number, j: number, top: 0 | 1) => top * (n + 1) ** 2 + i * (n + 1) + j;
  const triangles: number[] = [];
  const square = (a: number, b: number, c: number, d: number) => triangles.push(a, b, c, a, c, d);
  for (let i = 0; i < n; i += 1) {
    for (let j = 0; j < n; j += 1) {
      square(at(i, j, 0), at(i, j + 1, 0), at(i + 1, j + 1, 0), at(i + 1, j, 0));
      square(at(i, j, 1), at(i + 1, j, 1), at(i + 1, j + 1, 1), at(i, j + 1, 1));
    }
    square(at(i, 0, 0), at(i + 1, 0, 0), at(i + 1, 0, 1), at(i, 0, 1));
    square(at(i + 1, n, 0), at(i, n, 0), at(i, n, 1), at(i + 1, n, 1));
    square(at(0, i + 1, 0), at(0, i, 0), at(0, i, 1), at(0, i + 1, 1));
    square(at(n, i, 0), at(n, i + 1, 0), at(n, i + 1, 1), at(n, i, 1));
  }
  return { positions: Float64Array.from(positions), triangles: Uint32Array.from(triangles) };
}

it('a plate in 7 000 triangles is thin or not, as one in 12', () => {
  for (const n of [1, 60]) {
    expect(thinPlace(plate(n, 0.005), 0.01)).toMatchObject({ what: 'film', gapMm: 0.005 });
    expect(thinPlace(plate(n, 0.02), 0.01)).toBeNull();
  }
});

it('every pair of boxes that meet is among the neighbours', () => {
  let seed = 7;
  const random = () => (seed = (seed * 16_807) % 2_147_483_647) / 2_147_483_647;
  const low = Array.from({ length: 800 }, (): Vec3 => [random(), random(), random() / 9]);
  const high = low.map(([x, y, z]): Vec3 => [
    x + random() ** 6,
    y + random() ** 6,
    z + random() / 50,
  ]);
  const near = boxNeighbours(low, high);
  for (let i = 0; i < low.length; i += 1) {
    const given = new Set<number>();
    near.of(i, (other) => given.add(other));
    for (let j = i + 1; j < low.length; j += 1) {
      const meet = [0, 1, 2].every(
        (k) => low[i]![k]! <= high[j]![k]! && low[j]![k]! <= high[i]![k]!,
      );
      if (meet) expect(given.has(j)).toBe(true);
    }
  }
});
