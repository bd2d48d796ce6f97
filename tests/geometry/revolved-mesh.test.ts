import { describe, expect, it } from 'vitest';
import { ballProfile } from '~/geometry/ball-profile';
import { enclosedVolume, levels, type Mesh } from '~/geometry/mesh';
import { revolvedMesh } from '~/geometry/revolved-mesh';
import type { Vec2 } from '~/geometry/shape';
import type { Vec3 } from '~/geometry/vec3';

const turned = (profile: readonly Vec2[], facets = 16, stretch: Vec3 = [1, 1, 1]) =>
  revolvedMesh({ form: 'revolution', axis: 'z', profile, facets, phase: 0.3, stretch });

/** Every edge is met once in each direction. */
function isClosed({ triangles }: Mesh): boolean {
  const balance = new Map<string, number>();
  for (let n = 0; n < triangles.length; n += 1) {
    const from = triangles[n]!;
    const to = triangles[n % 3 === 2 ? n - 2 : n + 1]!;
    const key = `${Math.min(from, to)} ${Math.max(from, to)}`;
    balance.set(key, (balance.get(key) ?? 0) + (from < to ? 1 : -1));
  }
  return [...balance.values()].every((value) => value === 0);
}

describe('revolvedMesh', () => {
  it('encloses exactly a cylinder, a cone and a ball', () => {
    const cylinder = turned([
      [0, -50],
      [30, -50],
      [30, 50],
      [0, 50],
    ]);
    expect(isClosed(cylinder)).toBe(true);
    expect(enclosedVolume(cylinder) / (Math.PI * 900 * 100)).toBeCloseTo(1, 12);
    const cone = turned([
      [0, -50],
      [30, -50],
      [0, 50],
    ]);
    expect(isClosed(cone)).toBe(true);
    expect(enclosedVolume(cone) / ((Math.PI * 900 * 100) / 3)).toBeCloseTo(1, 12);
    const ball = turned(ballProfile(20, 32), 32, [2, 1, 1]);
    expect(isClosed(ball)).toBe(true);
    expect(enclosedVolume(ball) / ((8 / 3) * Math.PI * 8000)).toBeCloseTo(1, 12);
  });

  it('turns a hollowed end, and a profile that begins anywhere', () => {
    const bowl: Vec2[] = [
      [0, 10],
      [30, -50],
      [30, 50],
      [0, 50],
    ];
    const volume = Math.PI * 900 * 100 - (Math.PI * 900 * 60) / 3;
    for (let shift = 0; shift < 4; shift += 1) {
      const mesh = turned([...bowl.slice(shift), ...bowl.slice(0, shift)]);
      expect(isClosed(mesh)).toBe(true);
      expect(enclosedVolume(mesh) / volume).toBeCloseTo(1, 12);
    }
  });

  it('lies along any axis, its first meridian where it is told', () => {
    for (const axis of ['x', 'y', 'z'] as const) {
      const mesh = revolvedMesh({
        form: 'revolution',
        axis,
        profile: [
          [0, -1],
          [10, 0],
          [0, 2],
        ],
        facets: 4,
        phase: Math.PI / 2,
        stretch: [1, 1, 1],
      });
      const along = 'xyz'.indexOf(axis);
      const up = [0, 1, 2].map((i) => (i === along ? 1 : 0)) as [number, number, number];
      const heights = levels(mesh, up);
      expect([Math.min(...heights), Math.max(...heights)]).toEqual([-1, 2]);
      // the second direction of the outline: z for x, x for y, y for z
      const second = [0, 1, 2].map((i) => (i === (along + 2) % 3 ? 1 : 0)) as unknown as [
        number,
        number,
        number,
      ];
      expect(Math.max(...levels(mesh, second))).toBeCloseTo(10 * Math.sqrt(Math.PI / 2), 10);
      expect(enclosedVolume(mesh)).toBeCloseTo(Math.PI * 100, 10);
    }
  });
});
