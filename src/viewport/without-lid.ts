import type { TankMesh } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';

/** The mesh less its faces that lie level and look up: a region is ruled on the walls, not on the lid. */
export function withoutLid(mesh: TankMesh, up: Vec3): TankMesh {
  const { positions: p, triangles } = mesh;
  const kept: number[] = [];
  for (let t = 0; t < triangles.length; t += 3) {
    const [a, b, c] = [3 * triangles[t]!, 3 * triangles[t + 1]!, 3 * triangles[t + 2]!];
    const edge = (to: number): Vec3 => [
      p[to]! - p[a]!,
      p[to + 1]! - p[a + 1]!,
      p[to + 2]! - p[a + 2]!,
    ];
    const u = edge(b);
    const v = edge(c);
    const n: Vec3 = [
      u[1] * v[2] - u[2] * v[1],
      u[2] * v[0] - u[0] * v[2],
      u[0] * v[1] - u[1] * v[0],
    ];
    const rise = (n[0] * up[0] + n[1] * up[1] + n[2] * up[2]) / (Math.hypot(...n) || 1);
    if (rise < 0.995) kept.push(triangles[t]!, triangles[t + 1]!, triangles[t + 2]!);
  }
  return { positions: p, triangles: Uint32Array.from(kept) };
}
