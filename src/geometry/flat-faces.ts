import type { Mesh } from './mesh';
import { unionFind } from './union-find';
import { cross, type Vec3 } from './vec3';

/** A flat part of a mesh's surface. */
export interface FlatFace {
  /** Outward unit normal: one to a face, to the last bit. */
  normal: Vec3;
  /** Index of the first corner of each of its triangles. */
  triangles: number[];
}

/** An edge between two flat faces; the corners of `left` run from → to, those of `right` back. */
export interface FaceEdge {
  from: number;
  to: number;
  left: number;
  right: number;
}

/** Normals that differ by less belong to one flat face; a low triangle's is known the worse, the lower it is. */
const sameNormal = 1e-9;
const roundingMm = 4e-11;

/** A triangle lower than this has no direction of its own, mm. */
const sliverMm = 1e-5;

/**
 * The flat faces of a closed mesh, neighbouring triangles of one plane gathered, and the edges between them.
 * A sliver belongs to the face across its longest side.
 */
export function flatFaces({ positions, triangles }: Mesh): {
  faces: FlatFace[];
  edges: FaceEdge[];
} {
  const count = triangles.length / 3;
  const vertices = positions.length / 3;
  const at = (i: number): Vec3 => [positions[3 * i]!, positions[3 * i + 1]!, positions[3 * i + 2]!];
  const owner = new Map<number, number>();
  const normals: Vec3[] = [];
  const areas = new Float64Array(count);
  const heights = new Float64Array(count);
  const longest = new Uint8Array(count);
  for (let n = 0; n < count; n += 1) {
    const [i, j, k] = [triangles[3 * n]!, triangles[3 * n + 1]!, triangles[3 * n + 2]!];
    owner.set(i * vertices + j, n);
    owner.set(j * vertices + k, n);
    owner.set(k * vertices + i, n);
    const [a, b, c] = [at(i), at(j), at(k)];
    const sides = [minus(b, a), minus(c, b), minus(a, c)];
    const lengths = sides.map((side) => Math.hypot(...side));
    const long = Math.max(...lengths);
    const normal = cross(sides[0]!, sides[1]!);
    const size = Math.hypot(...normal);
    longest[n] = lengths.indexOf(long);
    areas[n] = size;
    heights[n] = long > 0 ? size / long : 0;
    normals.push(size > 0 ? [normal[0] / size, normal[1] / size, normal[2] / size] : [0, 0, 0]);
  }
  const across = (n: number, k: number) =>
    owner.get(triangles[3 * n + ((k + 1) % 3)]! * vertices + triangles[3 * n + k]!)!;
  const sliver = (n: number) => heights[n]! < sliverMm;

  const groups = unionFind(count);
  for (let n = 0; n < count; n += 1) {
    if (sliver(n)) {
      groups.join(across(n, longest[n]!), n);
      continue;
    }
    for (let k = 0; k < 3; k += 1) {
      const other = across(n, k);
      if (other < n || sliver(other)) continue;
      const allowed = sameNormal + roundingMm / Math.min(heights[n]!, heights[other]!);
      if (Math.hypot(...minus(normals[n]!, normals[other]!)) < allowed) groups.join(n, other);
    }
  }

  const indexOf = new Map<number, number>();
  const best: number[] = [];
  const faces: FlatFace[] = [];
  const faceOf = new Uint32Array(count);
  for (let n = 0; n < count; n += 1) {
    const root = groups.find(n);
    let face = indexOf.get(root);
    if (face === undefined) {
      face = faces.length;
      indexOf.set(root, face);
      faces.push({ normal: normals[n]!, triangles: [] });
      best.push(n);
    }
    faceOf[n] = face;
    faces[face]!.triangles.push(3 * n);
    if (areas[n]! > areas[best[face]!]!) {
      best[face] = n;
      faces[face]!.normal = normals[n]!;
    }
  }
  const edges: FaceEdge[] = [];
  for (let n = 0; n < count; n += 1) {
    for (let k = 0; k < 3; k += 1) {
      const other = across(n, k);
      if (other < n || faceOf[other] === faceOf[n]) continue;
      const from = triangles[3 * n + k]!;
      const to = triangles[3 * n + ((k + 1) % 3)]!;
      edges.push({ from, to, left: faceOf[n]!, right: faceOf[other]! });
    }
  }
  return { faces, edges };
}

function minus(a: Vec3, b: Vec3): Vec3 {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}
