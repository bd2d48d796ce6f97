import { orientation } from './orientation';
import type { Vec2 } from './shape';

/**
 * A polygon that runs against the clock and does not cross itself, cut into triangles (indices of its corners, each
 * against the clock and none flat) by taking off one ear after the other: a corner that stands out, in whose triangle
 * no other corner lies, its rim included. Corners in the middle of a straight side are kept, so that what lies beside
 * the polygon meets them. Exact; throws when the polygon crosses itself. Time grows as the cube of the corners at worst.
 */
export function earClipping(corners: readonly Vec2[]): (readonly [number, number, number])[] {
  const left = corners.map((_, i) => i);
  const triangles: (readonly [number, number, number])[] = [];
  while (left.length > 3) {
    const ear = left.findIndex((_, i) => isEar(corners, left, i));
    if (ear < 0) throw new Error('a polygon that crosses itself cannot be cut into triangles');
    triangles.push(around(left, ear));
    left.splice(ear, 1);
  }
  return [...triangles, around(left, 1)];
}

function around(left: readonly number[], i: number): readonly [number, number, number] {
  const n = left.length;
  return [left[(i + n - 1) % n]!, left[i]!, left[(i + 1) % n]!];
}

function isEar(corners: readonly Vec2[], left: readonly number[], i: number): boolean {
  const [a, b, c] = around(left, i).map((index) => corners[index]!) as [Vec2, Vec2, Vec2];
  if (orientation(a, b, c) <= 0) return false;
  return left.every((index) => {
    const p = corners[index]!;
    if (p === a || p === b || p === c) return true;
    return orientation(a, b, p) < 0 || orientation(b, c, p) < 0 || orientation(c, a, p) < 0;
  });
}
