import { creaseCos } from '../../geometry/crease';
import type { TankMesh } from '../table/preview';
import type { Frame } from './frame-grid';

/** Across, up, and away from the eye, mm. */
export type Point = readonly [number, number, number];

/** A triangle of a mesh as one elevation sees it. */
export interface Face {
  p: readonly [Point, Point, Point];
  corners: readonly [number, number, number];
  normal: Point;
  /** −1 towards the eye, 1 away from it, 0 edge on. */
  facing: -1 | 0 | 1;
  /** Its box: least and greatest place across and up, and least depth. */
  box: Frame & { nearest: number };
}

/** An edge that is drawn and the faces that meet there. */
export interface Edge {
  a: Point;
  b: Point;
  corners: readonly [number, number];
  faces: readonly [Face, Face];
  crease: boolean;
}

/** Faces seen nearer to edge on than this, as the sine, count as edge on. */
const edgeOn = 1e-6;

/** `at`: a vertex of the mesh as the elevation sees it, in left-handed axes. */
export function facesOf({ triangles }: TankMesh, at: (vertex: number) => Point): Face[] {
  const faces: Face[] = [];
  for (let t = 0; t < triangles.length; t += 3) {
    const corners = [triangles[t]!, triangles[t + 1]!, triangles[t + 2]!] as const;
    const p = [at(corners[0]), at(corners[1]), at(corners[2])] as const;
    const normal = normalOf(p);
    const facing = Math.abs(normal[2]) < edgeOn ? 0 : normal[2] < 0 ? -1 : 1;
    faces.push({ p, corners, normal, facing, box: boxOf(p) });
  }
  return faces;
}

/** Edges between faces that turn away from each other: creases, and the outlines of curved faces. */
export function edgesOf(faces: readonly Face[]): Edge[] {
  const edges = pairsOf(faces);
  const away = turnedAway(edges);
  const isAway = (one: Face) => one.facing > 0 || away.has(one);
  return edges.filter(({ crease, faces: [one, other] }) => crease || isAway(one) !== isAway(other));
}

function pairsOf(faces: readonly Face[]): Edge[] {
  const met = new Map<number, Face>();
  const edges: Edge[] = [];
  const most = 1 + faces.reduce((high, { corners }) => Math.max(high, ...corners), 0);
  for (const one of faces) {
    for (let i = 0; i < 3; i += 1) {
      const j = (i + 1) % 3;
      const [a, b] = [one.corners[i]!, one.corners[j]!];
      const key = a < b ? a * most + b : b * most + a;
      const other = met.get(key);
      if (other === undefined) {
        met.set(key, one);
        continue;
      }
      met.delete(key);
      const [m, n] = [one.normal, other.normal];
      const crease = m[0] * n[0] + m[1] * n[1] + m[2] * n[2] < creaseCos;
      edges.push({ a: one.p[i]!, b: one.p[j]!, corners: [a, b], faces: [one, other], crease });
    }
  }
  return edges;
}

/**
 * Faces edge on that lead to one turned away: the outline of a curved face may run where they begin. Those
 * among faces that all look at the eye have no part in one: the twisted side of a hull may begin with such a face.
 */
function turnedAway(edges: readonly Edge[]): Set<Face> {
  const beside = new Map<Face, Face[]>();
  const waiting: Face[] = [];
  const away = new Set<Face>();
  const reach = (one: Face) => {
    if (one.facing !== 0 || away.has(one)) return;
    away.add(one);
    waiting.push(one);
  };
  for (const {
    faces: [one, other],
  } of edges) {
    if (one.facing === 0) beside.set(one, [...(beside.get(one) ?? []), other]);
    if (other.facing === 0) beside.set(other, [...(beside.get(other) ?? []), one]);
    if (one.facing > 0) reach(other);
    if (other.facing > 0) reach(one);
  }
  for (let one = waiting.pop(); one; one = waiting.pop()) beside.get(one)?.forEach(reach);
  return away;
}

function boxOf([a, b, c]: Face['p']): Face['box'] {
  return {
    minX: Math.min(a[0], b[0], c[0]),
    maxX: Math.max(a[0], b[0], c[0]),
    minY: Math.min(a[1], b[1], c[1]),
    maxY: Math.max(a[1], b[1], c[1]),
    nearest: Math.min(a[2], b[2], c[2]),
  };
}

function normalOf([a, b, c]: Face['p']): Point {
  const u = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
  const v = [c[0] - a[0], c[1] - a[1], c[2] - a[2]];
  // the elevation's axes are left-handed: the outward normal is the other way round
  const n: Point = [
    u[2]! * v[1]! - u[1]! * v[2]!,
    u[0]! * v[2]! - u[2]! * v[0]!,
    u[1]! * v[0]! - u[0]! * v[1]!,
  ];
  const size = Math.hypot(...n) || 1;
  return [n[0] / size, n[1] / size, n[2] / size];
}
