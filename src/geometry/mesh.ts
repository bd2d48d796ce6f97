import type { Vec3 } from './vec3';

/** A closed triangle mesh, mm. Triangles index `positions` (x, y, z, x, …) in threes, outward. */
export interface Mesh {
  positions: Float64Array;
  triangles: Uint32Array;
}

/** Level u·p of every vertex, mm. */
export function levels(mesh: Mesh, up: Vec3): Float64Array {
  const { positions } = mesh;
  const result = new Float64Array(positions.length / 3);
  for (let i = 0, j = 0; i < result.length; i += 1, j += 3) {
    result[i] = up[0] * positions[j]! + up[1] * positions[j + 1]! + up[2] * positions[j + 2]!;
  }
  return result;
}

/** Enclosed volume, mm³; negative for an inside-out mesh. Exact but for rounding about the origin given. */
export function enclosedVolume(mesh: Mesh, origin: Vec3 = [0, 0, 0]): number {
  const { positions: p, triangles: t } = mesh;
  const [ox, oy, oz] = origin;
  let six = 0;
  for (let i = 0; i < t.length; i += 3) {
    const a = 3 * t[i]!;
    const b = 3 * t[i + 1]!;
    const c = 3 * t[i + 2]!;
    const ax = p[a]! - ox;
    const ay = p[a + 1]! - oy;
    const az = p[a + 2]! - oz;
    const bx = p[b]! - ox;
    const by = p[b + 1]! - oy;
    const bz = p[b + 2]! - oz;
    const cx = p[c]! - ox;
    const cy = p[c + 1]! - oy;
    const cz = p[c + 2]! - oz;
    six += ax * (by * cz - bz * cy) + ay * (bz * cx - bx * cz) + az * (bx * cy - by * cx);
  }
  return six / 6;
}

/** The mesh moved by `shift`, mm. */
export function shifted(mesh: Mesh, shift: Vec3): Mesh {
  const positions = Float64Array.from(mesh.positions, (value, i) => value + shift[i % 3]!);
  return { positions, triangles: mesh.triangles };
}
