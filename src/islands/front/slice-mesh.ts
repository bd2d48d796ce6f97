import type { TankMesh } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';

/** A vertex of a mesh, mm, tank's frame. */
export function vertex(mesh: TankMesh, index: number): Vec3 {
  const p = mesh.positions;
  return [p[index * 3]!, p[index * 3 + 1]!, p[index * 3 + 2]!];
}

/** The part of every triangle that lies between two levels (u·p, mm), as convex polygons. */
export function facesBetween(mesh: TankMesh, up: Vec3, low: number, high: number): Vec3[][] {
  const parts: Vec3[][] = [];
  for (let t = 0; t < mesh.triangles.length; t += 3) {
    const corners = [0, 1, 2].map((k) => vertex(mesh, mesh.triangles[t + k]!));
    const part = cut(cut(corners, up, low, 1), up, high, -1);
    if (part.length >= 3) parts.push(part);
  }
  return parts;
}

/**
 * The liquid surface: closed loops where the mesh crosses a level. A vertex that lies on the level
 * counts as above it, so that every loop closes.
 */
export function surfaceLoops(mesh: TankMesh, up: Vec3, level: number): Vec3[][] {
  const next = new Map<string, { point: Vec3; to: string }>();
  for (let t = 0; t < mesh.triangles.length; t += 3) {
    const ids = [0, 1, 2].map((k) => mesh.triangles[t + k]!);
    let from: { key: string; point: Vec3 } | null = null;
    let to: string | null = null;
    for (let k = 0; k < 3; k += 1) {
      const a = ids[k]!;
      const b = ids[(k + 1) % 3]!;
      const da = dot(up, vertex(mesh, a)) - level;
      const db = dot(up, vertex(mesh, b)) - level;
      if (da < 0 === db < 0) continue;
      const key = a < b ? `${a}:${b}` : `${b}:${a}`;
      if (da < 0) from = { key, point: mix(vertex(mesh, a), vertex(mesh, b), da / (da - db)) };
      else to = key;
    }
    if (from !== null && to !== null) next.set(from.key, { point: from.point, to });
  }
  const loops: Vec3[][] = [];
  while (next.size > 0) {
    const loop: Vec3[] = [];
    let key = next.keys().next().value!;
    for (let step = next.get(key); step !== undefined; step = next.get(key)) {
      next.delete(key);
      loop.push(step.point);
      key = step.to;
    }
    loops.push(loop);
  }
  return loops;
}

/** Keeps the side where side × (u·p − level) ≥ 0. */
function cut(polygon: Vec3[], up: Vec3, level: number, side: 1 | -1): Vec3[] {
  const kept: Vec3[] = [];
  polygon.forEach((a, index) => {
    const b = polygon[(index + 1) % polygon.length]!;
    const da = side * (dot(up, a) - level);
    const db = side * (dot(up, b) - level);
    if (da >= 0) kept.push(a);
    if ((da > 0 && db < 0) || (da < 0 && db > 0)) kept.push(mix(a, b, da / (da - db)));
  });
  return kept;
}

function mix(a: Vec3, b: Vec3, t: number): Vec3 {
  return [a[0] + t * (b[0] - a[0]), a[1] + t * (b[1] - a[1]), a[2] + t * (b[2] - a[2])];
}

function dot(a: Vec3, b: Vec3): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}
