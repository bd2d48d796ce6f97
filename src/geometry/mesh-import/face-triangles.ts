import { meshCaps } from './mesh-caps';
import type { Vec3 } from '../vec3';

type Flat = readonly [number, number];

/**
 * A face of any number of corners as triangles (indices into `corners`, in threes, the way the face runs). Looked
 * at square on: a fan from its first corner where that fits (every convex face), otherwise ear by ear. null when
 * no ear is found, as in some that cross themselves, or it is not convex and has more than 64 corners. The rim of the
 * triangles is the face's own in any case. A face that is not flat is bent along its cuts.
 */
export function faceTriangles(corners: readonly Vec3[]): number[] | null {
  if (corners.length === 3) return [0, 1, 2];
  const flat = seenSquareOn(corners);
  if (fanFits(flat)) {
    return Array.from({ length: corners.length - 2 }, (_, i) => [0, i + 1, i + 2]).flat();
  }
  return corners.length > meshCaps.concaveCorners ? null : byEars(flat);
}

/** Without the axis that the face's area vector (Newell) points along most; against the clock. */
function seenSquareOn(corners: readonly Vec3[]): Flat[] {
  const area = [0, 1, 2].map((axis) => {
    const [u, v] = [(axis + 1) % 3, (axis + 2) % 3];
    return corners.reduce((sum, from, i) => {
      const to = corners[(i + 1) % corners.length]!;
      return sum + (from[u]! - to[u]!) * (from[v]! + to[v]!);
    }, 0);
  });
  const most = area.map(Math.abs);
  const axis = most[0]! >= most[1]! && most[0]! >= most[2]! ? 0 : most[1]! >= most[2]! ? 1 : 2;
  const [u, v] = [(axis + 1) % 3, (axis + 2) % 3];
  return corners.map((corner): Flat =>
    area[axis]! < 0 ? [corner[v]!, corner[u]!] : [corner[u]!, corner[v]!],
  );
}

function fanFits(flat: readonly Flat[]): boolean {
  const areas = flat.slice(2).map((_, i) => turn(flat[0]!, flat[i + 1]!, flat[i + 2]!));
  return areas.every((area) => area >= 0);
}

function byEars(flat: readonly Flat[]): number[] | null {
  const left = flat.map((_, i) => i);
  const triangles: number[] = [];
  while (left.length > 3) {
    const ear = left.findIndex((_, i) => isEar(flat, left, i));
    if (ear < 0) return null;
    triangles.push(...around(left, ear));
    left.splice(ear, 1);
  }
  return [...triangles, ...left];
}

function isEar(flat: readonly Flat[], left: readonly number[], at: number): boolean {
  const [i, j, k] = around(left, at);
  const [a, b, c] = [flat[i]!, flat[j]!, flat[k]!];
  if (turn(a, b, c) <= 0) return false;
  return left.every((other) => {
    const p = flat[other]!;
    if ([a, b, c].some((corner) => corner[0] === p[0] && corner[1] === p[1])) return true;
    return turn(a, b, p) < 0 || turn(b, c, p) < 0 || turn(c, a, p) < 0;
  });
}

function around(left: readonly number[], at: number): [number, number, number] {
  const n = left.length;
  return [left[(at + n - 1) % n]!, left[at]!, left[(at + 1) % n]!];
}

/** Twice the area of a triangle; positive against the clock. */
function turn([ax, ay]: Flat, [bx, by]: Flat, [cx, cy]: Flat): number {
  return (bx - ax) * (cy - ay) - (by - ay) * (cx - ax);
}
