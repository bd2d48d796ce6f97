import type { TankMesh } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';
import { sectionLoops } from '~/geometry/section';
import { dot } from '~/geometry/vec3';

/** A vertex of a mesh, mm, tank's frame. */
function vertex(mesh: TankMesh, index: number): Vec3 {
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

/** The liquid surface: closed loops where the mesh crosses a level (u·p, mm). */
export function surfaceLoops(mesh: TankMesh, up: Vec3, level: number): Vec3[][] {
  return sectionLoops(mesh, up, level).map((loop) =>
    Array.from({ length: loop.length / 3 }, (_, i): Vec3 => [
      loop[3 * i]!,
      loop[3 * i + 1]!,
      loop[3 * i + 2]!,
    ]),
  );
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
