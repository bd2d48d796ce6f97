import type { TankMesh } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';
import { faces, type Oblique } from './oblique';
import { vertex } from './slice-mesh';

export interface DrawnEdge {
  from: Vec3;
  to: Vec3;
  /** outline: one neighbour looks at the reader; visible: both; hidden: none. */
  line: 'outline' | 'visible' | 'hidden';
}

/** Faces that meet at less than this are drawn as one curved face, degrees. */
const smoothBelow = 20;

/** The edges that a draughtsman would draw: where two faces meet at an angle, or where the outline runs. */
export function drawnEdges(mesh: TankMesh, view: Oblique): DrawnEdge[] {
  const limit = Math.cos((smoothBelow * Math.PI) / 180);
  const open = new Map<string, Vec3>();
  const edges: DrawnEdge[] = [];
  for (let t = 0; t < mesh.triangles.length; t += 3) {
    const ids = [0, 1, 2].map((k) => mesh.triangles[t + k]!) as [number, number, number];
    const normal = normalOf(vertex(mesh, ids[0]), vertex(mesh, ids[1]), vertex(mesh, ids[2]));
    for (let k = 0; k < 3; k += 1) {
      const a = ids[k]!;
      const b = ids[(k + 1) % 3]!;
      const key = a < b ? `${a}:${b}` : `${b}:${a}`;
      const other = open.get(key);
      if (other === undefined) {
        open.set(key, normal);
        continue;
      }
      const seen = Number(faces(view, normal)) + Number(faces(view, other));
      const cosine = normal[0] * other[0] + normal[1] * other[1] + normal[2] * other[2];
      if (cosine > limit && seen !== 1) continue;
      edges.push({
        from: vertex(mesh, a),
        to: vertex(mesh, b),
        line: seen === 1 ? 'outline' : seen === 2 ? 'visible' : 'hidden',
      });
    }
  }
  return edges;
}

function normalOf(a: Vec3, b: Vec3, c: Vec3): Vec3 {
  const u = [b[0] - a[0], b[1] - a[1], b[2] - a[2]] as const;
  const v = [c[0] - a[0], c[1] - a[1], c[2] - a[2]] as const;
  const n = [u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]] as const;
  const size = Math.hypot(...n) || 1;
  return [n[0] / size, n[1] / size, n[2] / size];
}
