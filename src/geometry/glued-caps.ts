import type { Mesh } from './mesh';
import { placedMesh } from './placed-mesh';
import type { Placing } from './placing';
import { revolvedMesh } from './revolved-mesh';
import { axisOrder, type Shape, type Vec2 } from './shape';
import { along, cross, dot, type Vec3 } from './vec3';

/** A cap to be put back, the turned solid that it was cut off, and where that stands. */
export interface CapToGlue {
  shape: Extract<Shape, { form: 'revolution' }>;
  /** Open profile, from the axis to the rim or from the rim to the axis. */
  profile: readonly Vec2[];
  place: Placing;
}

/** How far from the plane of a cut a vertex may stand that lies in it: twice the snapping. mm */
const inPlaneMm = 2e-6;

/**
 * Caps put back on the flat ends that were left in their stead: the ends' triangles go, the rims are shared.
 * Mesh and caps are in the tank's frame moved by −origin. null when a rim is not there as it was.
 */
export function gluedCaps(mesh: Mesh, caps: readonly CapToGlue[], origin: Vec3): Mesh | null {
  const dropped = new Uint8Array(mesh.triangles.length / 3);
  const found: Rim[] = [];
  for (const cap of caps) {
    const rim = rimOf(mesh, cap, origin);
    if (!rim) return null;
    for (const triangle of rim.end) dropped[triangle] = 1;
    found.push(rim);
  }
  const more = found.reduce((sum, { cap }) => sum + cap.positions.length, 0);
  const positions = new Float64Array(mesh.positions.length + more);
  positions.set(mesh.positions);
  const triangles = new Uint32Array(
    mesh.triangles.length + found.reduce((sum, { cap }) => sum + cap.triangles.length, 0),
  );
  let filled = 0;
  for (let n = 0; n < mesh.triangles.length; n += 3) {
    if (dropped[n / 3]) continue;
    for (let k = 0; k < 3; k += 1) triangles[filled + k] = mesh.triangles[n + k]!;
    filled += 3;
  }
  let start = mesh.positions.length;
  for (const { cap, shared } of found) {
    positions.set(cap.positions, start);
    const own = start / 3;
    for (let n = 0; n < cap.triangles.length; n += 1, filled += 1) {
      const vertex = cap.triangles[n]!;
      triangles[filled] = shared[vertex]! < 0 ? own + vertex : shared[vertex]!;
    }
    start += cap.positions.length;
  }
  return withoutUnused(positions, triangles.subarray(0, filled));
}

interface Rim {
  cap: Mesh;
  /** By vertex of the cap: the mesh's own vertex where both have it, else −1. */
  shared: Int32Array;
  /** Triangles of the flat end. */
  end: readonly number[];
}

function rimOf(mesh: Mesh, { shape, profile, place }: CapToGlue, origin: Vec3): Rim | null {
  const cap = placedMesh(revolvedMesh({ ...shape, profile }), place, origin);
  const axis = axisOrder(shape.axis)[2];
  const isLow = profile[0]![0] === 0;
  const cut = (isLow ? profile.at(-1)! : profile[0]!)[1] * shape.stretch[axis];
  const first = isLow ? cap.positions.length / 3 - shape.facets : 0;

  const normal: Vec3 = [place.rows[0][axis]!, place.rows[1][axis]!, place.rows[2][axis]!];
  const level = cut + dot(normal, along(place.centre, origin, -1));
  const { positions } = mesh;
  const isOn = new Uint8Array(positions.length / 3);
  const byPlace = new Map<string, number>();
  for (let vertex = 0, i = 0; i < positions.length; vertex += 1, i += 3) {
    const height =
      normal[0] * positions[i]! + normal[1] * positions[i + 1]! + normal[2] * positions[i + 2]!;
    if (Math.abs(height - level) > inPlaneMm) continue;
    isOn[vertex] = 1;
    byPlace.set(keyOf(positions, vertex), vertex);
  }
  const shared = new Int32Array(cap.positions.length / 3).fill(-1);
  for (let i = first; i < first + shape.facets; i += 1) {
    const vertex = byPlace.get(keyOf(cap.positions, i));
    if (vertex === undefined) return null;
    shared[i] = vertex;
  }

  const end: number[] = [];
  let area = 0;
  for (let n = 0; n < mesh.triangles.length; n += 3) {
    const [i, j, k] = [mesh.triangles[n]!, mesh.triangles[n + 1]!, mesh.triangles[n + 2]!];
    if (!isOn[i] || !isOn[j] || !isOn[k]) continue;
    end.push(n / 3);
    area += areaOf(mesh, i, j, k);
  }
  let whole = 0;
  for (let i = 1; i + 1 < shape.facets; i += 1) {
    whole += areaOf(cap, first, first + i, first + i + 1);
  }
  return Math.abs(area - whole) > 1e-9 * whole ? null : { cap, shared, end };
}

function withoutUnused(positions: Float64Array, triangles: Uint32Array): Mesh {
  const place = new Int32Array(positions.length / 3).fill(-1);
  const used = new Float64Array(positions.length);
  let count = 0;
  const renamed = new Uint32Array(triangles.length);
  for (let n = 0; n < triangles.length; n += 1) {
    const vertex = triangles[n]!;
    if (place[vertex]! < 0) {
      place[vertex] = count;
      used[3 * count] = positions[3 * vertex]!;
      used[3 * count + 1] = positions[3 * vertex + 1]!;
      used[3 * count + 2] = positions[3 * vertex + 2]!;
      count += 1;
    }
    renamed[n] = place[vertex]!;
  }
  return { positions: used.slice(0, 3 * count), triangles: renamed };
}

function areaOf(mesh: Mesh, i: number, j: number, k: number): number {
  const [a, b, c] = [pointAt(mesh, i), pointAt(mesh, j), pointAt(mesh, k)];
  return Math.hypot(...cross(along(b, a, -1), along(c, a, -1))) / 2;
}

function pointAt({ positions }: Mesh, vertex: number): Vec3 {
  return [positions[3 * vertex]!, positions[3 * vertex + 1]!, positions[3 * vertex + 2]!];
}

function keyOf(positions: Float64Array, vertex: number): string {
  // + 0 makes one of the two zeros
  return [0, 1, 2].map((k) => positions[3 * vertex + k]! + 0).join(' ');
}
