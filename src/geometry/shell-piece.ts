import type { Mesh } from './mesh';
import { cross, dot, type Vec3 } from './vec3';

/** A part of a mesh's surface: triangles by their first corner, each with the outward unit normal of its face. */
export interface Patch {
  triangles: readonly number[];
  normals: readonly Vec3[];
}

/** Part of a patch that may turn over at its rim. */
const mostLost = 0.001;
const passes = 3;

/**
 * The wall on the inside of a part of a mesh's surface as one closed mesh: every corner goes `wallMm` along the
 * normals of the faces that meet there (mitred, so that each face moves by wallMm), and half as far outward. null when a
 * face turns over on the way, as on a surface bent more sharply than the wall is thick.
 */
export function shellPiece(
  { positions, triangles }: Mesh,
  patch: Patch,
  wallMm: number,
): Mesh | null {
  const normalsAt = new Map<number, Vec3[]>();
  const sides = new Map<number, [number, number]>();
  const vertices = positions.length / 3;
  patch.triangles.forEach((n, t) => {
    const corners = [triangles[n]!, triangles[n + 1]!, triangles[n + 2]!];
    corners.forEach((i, k) => {
      const list = normalsAt.get(i);
      if (!list) normalsAt.set(i, [patch.normals[t]!]);
      else if (!list.includes(patch.normals[t]!)) list.push(patch.normals[t]!);
      const j = corners[(k + 1) % 3]!;
      // a side met from both triangles lies inside the patch
      if (!sides.delete(j * vertices + i)) sides.set(i * vertices + j, [i, j]);
    });
  });
  const index = new Map<number, number>();
  const result = new Float64Array(6 * normalsAt.size);
  const move = (vertex: number, direction: Vec3) => {
    const i = index.get(vertex)!;
    for (let axis = 0; axis < 3; axis += 1) {
      const place = positions[3 * vertex + axis]!;
      result[6 * i + axis] = place + (wallMm / 2) * direction[axis]!;
      result[6 * i + 3 + axis] = place - wallMm * direction[axis]!;
    }
  };
  const directions = new Map<number, Vec3>();
  for (const [vertex, normals] of normalsAt) {
    const direction = mitre(normals);
    if (!direction) return null;
    index.set(vertex, index.size);
    directions.set(vertex, direction);
    move(vertex, direction);
  }
  const inner = (vertex: number) => placeOf(result, 2 * index.get(vertex)! + 1);
  const outer = (vertex: number) => placeOf(positions, vertex);
  const rim = new Set([...sides.values()].flat());
  const cornersAt = (n: number) => [triangles[n]!, triangles[n + 1]!, triangles[n + 2]!] as const;
  /** Twice the area by which a triangle turned over; 0 when it did not. */
  const turnedOver = (n: number, t: number) => {
    const normal = patch.normals[t]!;
    const corners = cornersAt(n);
    const after = turned(corners.map(inner), normal);
    return after < 0 && turned(corners.map(outer), normal) > 0 ? -after : 0;
  };
  for (let pass = 0; pass < passes; pass += 1) {
    patch.triangles.forEach((n, t) => {
      if (turnedOver(n, t) === 0) return;
      // a corner of the rim may as well go the way of a mitre beside it: it stays in its own plane
      const corners = cornersAt(n);
      const [giver] = [...corners].sort(
        (one, other) => normalsAt.get(other)!.length - normalsAt.get(one)!.length,
      );
      for (const vertex of corners) {
        const fits = normalsAt
          .get(vertex)!
          .every((normal) => normalsAt.get(giver!)!.includes(normal));
        if (!fits || !rim.has(vertex)) continue;
        directions.set(vertex, directions.get(giver!)!);
        move(vertex, directions.get(giver!)!);
      }
    });
  }
  const faces: number[] = [];
  let area = 0;
  let lost = 0;
  for (const [t, n] of patch.triangles.entries()) {
    const corners = cornersAt(n);
    const over = turnedOver(n, t);
    area += Math.abs(turned(corners.map(inner), patch.normals[t]!));
    if (over > 0) {
      // what is left of this lies at the rim, within the round wall of the seam there
      if (!corners.some((vertex) => rim.has(vertex))) return null;
      lost += over;
    }
    const [i, j, k] = corners.map((vertex) => 2 * index.get(vertex)!) as [number, number, number];
    faces.push(i, j, k, k + 1, j + 1, i + 1);
  }
  if (lost > mostLost * area) return null;
  for (const [from, to] of sides.values()) {
    const [i, j] = [2 * index.get(from)!, 2 * index.get(to)!];
    faces.push(j, i, i + 1, j, i + 1, j + 1);
  }
  return { positions: result, triangles: Uint32Array.from(faces) };
}

/** Twice a triangle's area as its normal sees it, negative when it has turned over; 0 for a sliver. */
function turned([a, b, c]: Vec3[], normal: Vec3): number {
  const [u, v] = [minus(b!, a!), minus(c!, a!)];
  const area = dot(cross(u, v), normal);
  return Math.abs(area) > 1e-5 * Math.max(Math.hypot(...u), Math.hypot(...v)) ? area : 0;
}

function placeOf(positions: Float64Array, vertex: number): Vec3 {
  return [positions[3 * vertex]!, positions[3 * vertex + 1]!, positions[3 * vertex + 2]!];
}

/** The shortest d with n·d = 1 for every normal, as near as may be for more than two; null where they oppose. */
function mitre(normals: readonly Vec3[]): Vec3 | null {
  const [one, other] = normals as [Vec3, Vec3?];
  if (!other) return one;
  if (normals.length === 2) {
    const scale = 1 / (1 + dot(one, other));
    return scale < 0.7
      ? [scale * (one[0] + other[0]), scale * (one[1] + other[1]), scale * (one[2] + other[2])]
      : null;
  }
  const sum: [number, number, number] = [0, 0, 0];
  for (const normal of normals) for (let axis = 0; axis < 3; axis += 1) sum[axis]! += normal[axis]!;
  const size = Math.hypot(...sum);
  const mean: Vec3 = [sum[0] / size, sum[1] / size, sum[2] / size];
  const least = Math.min(...normals.map((normal) => dot(normal, mean)));
  return least > 0.7 ? [mean[0] / least, mean[1] / least, mean[2] / least] : null;
}

function minus(a: Vec3, b: Vec3): Vec3 {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}
