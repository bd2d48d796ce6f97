import type { Mesh } from './mesh';
import type { Vec3 } from './vec3';

/** The triangle nearest to a point (index of its first corner in `triangles`) and how far it is, mm. */
export function nearestTriangle(mesh: Mesh, point: Vec3): { triangle: number; distanceMm: number } {
  let triangle = -1;
  let least = Infinity;
  for (let n = 0; n < mesh.triangles.length; n += 3) {
    const squared = squaredDistance(mesh, n, point);
    if (squared < least) {
      least = squared;
      triangle = n;
    }
  }
  return { triangle, distanceMm: Math.sqrt(least) };
}

/** Foot of the point on the triangle by its Voronoi regions: corner, side or inside. mm² */
function squaredDistance({ positions: p, triangles }: Mesh, n: number, [x, y, z]: Vec3): number {
  const i = 3 * triangles[n]!;
  const j = 3 * triangles[n + 1]!;
  const k = 3 * triangles[n + 2]!;
  const abx = p[j]! - p[i]!;
  const aby = p[j + 1]! - p[i + 1]!;
  const abz = p[j + 2]! - p[i + 2]!;
  const acx = p[k]! - p[i]!;
  const acy = p[k + 1]! - p[i + 1]!;
  const acz = p[k + 2]! - p[i + 2]!;
  const apx = x - p[i]!;
  const apy = y - p[i + 1]!;
  const apz = z - p[i + 2]!;
  const d1 = abx * apx + aby * apy + abz * apz;
  const d2 = acx * apx + acy * apy + acz * apz;
  const bb = abx * abx + aby * aby + abz * abz;
  const cc = acx * acx + acy * acy + acz * acz;
  const bc = abx * acx + aby * acy + abz * acz;
  const det = bb * cc - bc * bc;
  // inside: solve for the foot; else the nearest of the three sides
  if (det > 0) {
    const v = (cc * d1 - bc * d2) / det;
    const w = (bb * d2 - bc * d1) / det;
    if (v >= 0 && w >= 0 && v + w <= 1) return from(v, w);
  }
  return Math.min(
    from(clamp(d1 / bb), 0),
    from(0, clamp(d2 / cc)),
    side((d2 - d1 + bb - bc) / (bb + cc - 2 * bc)),
  );

  function side(t: number): number {
    const w = clamp(t);
    return from(1 - w, w);
  }
  function from(v: number, w: number): number {
    const dx = apx - v * abx - w * acx;
    const dy = apy - v * aby - w * acy;
    const dz = apz - v * abz - w * acz;
    return dx * dx + dy * dy + dz * dz;
  }
}

function clamp(t: number): number {
  return t > 0 ? Math.min(t, 1) : 0;
}
