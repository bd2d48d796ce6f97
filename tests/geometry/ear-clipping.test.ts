import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { earClipping } from '~/geometry/ear-clipping';
import { orientation } from '~/geometry/orientation';
import { polygonArea } from '~/geometry/outline-area';
import type { Vec2 } from '~/geometry/shape';

describe('orientation', () => {
  it('tells the sides of a line', () => {
    expect(orientation([0, 0], [1, 0], [0, 1])).toBe(1);
    expect(orientation([0, 0], [1, 0], [0, -1])).toBe(-1);
    expect(orientation([0, 0], [1, 1], [2, 2])).toBe(0);
  });

  it('is exact where rounding would decide: a step of the last bit off a long line', () => {
    // 0.5 and its neighbours against the line through (12, 12) and (24, 24): the classic trial of orientation
    // tests (Kettner et al., "Classroom examples of robustness problems", 2008, from memory)
    const step = 2 ** -53;
    for (let i = 0; i < 30; i += 1) {
      for (let j = 0; j < 30; j += 1) {
        const p: Vec2 = [0.5 + i * step, 0.5 + j * step];
        expect(orientation([12, 12], [24, 24], p)).toBe(Math.sign(p[1] - p[0]));
      }
    }
    expect(orientation([-1e5, -1e-300], [1e5, 1e-300], [0, 0])).toBe(0);
    expect(orientation([-1e5, -1e-300], [1e5, 1e-300], [0, 5e-324])).toBe(1);
  });
});

describe('earClipping', () => {
  const checked = (corners: readonly Vec2[]) => {
    const triangles = earClipping(corners);
    expect(triangles).toHaveLength(corners.length - 2);
    let area = 0;
    const edges = new Map<string, number>();
    for (const [i, j, k] of triangles) {
      const [a, b, c] = [corners[i]!, corners[j]!, corners[k]!];
      expect(orientation(a, b, c)).toBe(1);
      area += polygonArea([a, b, c]);
      for (const [from, to] of [
        [i, j],
        [j, k],
        [k, i],
      ] as const) {
        const key = `${Math.min(from, to)} ${Math.max(from, to)}`;
        edges.set(key, (edges.get(key) ?? 0) + (from < to ? 1 : -1));
      }
    }
    // every side of the polygon once, every cut from both sides
    corners.forEach((_, i) => {
      const j = (i + 1) % corners.length;
      expect(Math.abs(edges.get(`${Math.min(i, j)} ${Math.max(i, j)}`)!)).toBe(1);
    });
    expect([...edges.values()].filter((balance) => balance !== 0)).toHaveLength(corners.length);
    expect(area / polygonArea(corners)).toBeCloseTo(1, 12);
  };

  it('cuts a triangle, a square, an L and a comb', () => {
    checked([
      [0, 0],
      [1, 0],
      [0, 1],
    ]);
    checked([
      [0, 0],
      [2, 0],
      [2, 2],
      [0, 2],
    ]);
    checked([
      [0, 0],
      [2, 0],
      [2, 1],
      [1, 1],
      [1, 2],
      [0, 2],
    ]);
    const teeth = Array.from({ length: 20 }, (_, i): Vec2[] => [
      [-2 * i, 5],
      [-2 * i - 1, 5],
      [-2 * i - 1, 1],
      [-2 * i - 2, 1],
    ]).flat();
    checked([[-40, 0], [0, 0], ...teeth]);
  });

  it('keeps corners in the middle of straight sides, and cuts no flat triangle', () => {
    checked([
      [0, 0],
      [1, 0],
      [2, 0],
      [3, 0],
      [1.5, 1.5],
      [0, 3],
      [0, 2],
      [0, 1],
    ]);
  });

  it('cuts stars of any corners', () => {
    const radius = fc.double({ min: 1, max: 100, noNaN: true });
    fc.assert(
      fc.property(fc.array(radius, { minLength: 5, maxLength: 60 }), (radii) => {
        checked(
          radii.map((r, i): Vec2 => {
            const angle = (2 * Math.PI * i) / radii.length;
            return [r * Math.cos(angle), r * Math.sin(angle)];
          }),
        );
      }),
      { numRuns: 60, seed: 5 },
    );
  });

  it('refuses a polygon that runs with the clock', () => {
    expect(() =>
      earClipping([
        [0, 0],
        [0, 1],
        [1, 1],
        [1, 0],
      ]),
    ).toThrow('crosses itself');
  });
});
