import type { TankMesh } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';
import { creaseCos } from '~/geometry/crease';

/**
 * The lines a draughtsman would draw of a closed mesh: its creases, and from a given side the
 * outline of its round parts. Coordinates in the frame of the mesh.
 */
export interface EdgeList {
  /** x0 y0 z0 x1 y1 z1 an edge. */
  segments: Float64Array;
  /** The two faces' normals an edge, six numbers. */
  normals: Float64Array;
  crease: Uint8Array;
}

export function edgesOf(mesh: TankMesh): EdgeList {
  const { positions, triangles } = mesh;
  const first = new Map<number, number>();
  const count = positions.length / 3;
  const normals = new Float64Array(triangles.length);
  const segments: number[] = [];
  const pairs: number[] = [];
  const crease: number[] = [];
  for (let t = 0; t < triangles.length; t += 3) normalInto(normals, t, positions, triangles);
  for (let t = 0; t < triangles.length; t += 3) {
    for (let corner = 0; corner < 3; corner += 1) {
      const a = triangles[t + corner]!;
      const b = triangles[t + ((corner + 1) % 3)]!;
      const key = a < b ? a * count + b : b * count + a;
      const other = first.get(key);
      if (other === undefined) {
        first.set(key, t);
        continue;
      }
      first.delete(key);
      const dot =
        normals[t]! * normals[other]! +
        normals[t + 1]! * normals[other + 1]! +
        normals[t + 2]! * normals[other + 2]!;
      if (dot > 0.9999999) continue;
      for (const v of [a, b]) {
        segments.push(positions[3 * v]!, positions[3 * v + 1]!, positions[3 * v + 2]!);
      }
      for (const f of [t, other]) pairs.push(normals[f]!, normals[f + 1]!, normals[f + 2]!);
      crease.push(dot < creaseCos ? 1 : 0);
    }
  }
  return {
    segments: Float64Array.from(segments),
    normals: Float64Array.from(pairs),
    crease: Uint8Array.from(crease),
  };
}

/** Creases, and the smooth edges where the surface turns away from the viewer. */
export function edgesSeenFrom(edges: EdgeList, towards: Vec3): Float32Array {
  const drawn: number[] = [];
  for (let e = 0; e < edges.crease.length; e += 1) {
    const n = edges.normals;
    const i = 6 * e;
    const one = n[i]! * towards[0] + n[i + 1]! * towards[1] + n[i + 2]! * towards[2];
    const two = n[i + 3]! * towards[0] + n[i + 4]! * towards[1] + n[i + 5]! * towards[2];
    if (edges.crease[e] === 1 || one > 0 !== two > 0) {
      for (let k = 0; k < 6; k += 1) drawn.push(edges.segments[i + k]!);
    }
  }
  return Float32Array.from(drawn);
}

function normalInto(into: Float64Array, t: number, p: Float64Array, triangles: Uint32Array) {
  const [a, b, c] = [3 * triangles[t]!, 3 * triangles[t + 1]!, 3 * triangles[t + 2]!];
  const ux = p[b]! - p[a]!;
  const uy = p[b + 1]! - p[a + 1]!;
  const uz = p[b + 2]! - p[a + 2]!;
  const vx = p[c]! - p[a]!;
  const vy = p[c + 1]! - p[a + 1]!;
  const vz = p[c + 2]! - p[a + 2]!;
  const nx = uy * vz - uz * vy;
  const ny = uz * vx - ux * vz;
  const nz = ux * vy - uy * vx;
  const size = Math.hypot(nx, ny, nz) || 1;
  into[t] = nx / size;
  into[t + 1] = ny / size;
  into[t + 2] = nz / size;
}
