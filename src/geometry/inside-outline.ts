import { pointOnArc, withinArc, type CornerArc } from './rounded-outline';
import type { Vec2 } from './shape';

/** A closed outline of straight sides and arcs, any direction of travel. */
export interface OutlineParts {
  corners: readonly Vec2[];
  /** By corner, the arc that rounds it, if any. */
  arcs: readonly (CornerArc | null)[];
}

/** The straight side from a corner to the next, between the arcs; of no length where two arcs meet. */
export function sideOf({ corners, arcs }: OutlineParts, i: number): readonly [Vec2, Vec2] {
  const j = (i + 1) % corners.length;
  const [before, after] = [arcs[i], arcs[j]];
  return [
    before ? pointOnArc(before, Math.abs(before.sweep)) : corners[i]!,
    after ? pointOnArc(after, 0) : corners[j]!,
  ];
}

/**
 * Whether a point lies in an outline. Nearer to it than |slack| mm it does when the slack is above 0 and does not
 * when it is below.
 */
export function insideOutline(outline: OutlineParts, point: Vec2, slack: number): boolean {
  if (slack !== 0 && distanceTo(outline, point) <= Math.abs(slack)) return slack > 0;
  const { corners, arcs } = outline;
  const [x, y] = point;
  let inside = false;
  corners.forEach(([ax, ay], i) => {
    const [bx, by] = corners[(i + 1) % corners.length]!;
    if (ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)) inside = !inside;
  });
  // what lies between a corner and its arc is on the other side of the outline than of its sharp sides
  arcs.forEach((arc, i) => {
    if (arc && betweenCornerAndArc(corners[i]!, arc, point)) inside = !inside;
  });
  return inside;
}

function distanceTo(outline: OutlineParts, [x, y]: Vec2): number {
  let least = Infinity;
  outline.corners.forEach((_, i) => {
    const [[ax, ay], [bx, by]] = sideOf(outline, i);
    const [dx, dy] = [bx - ax, by - ay];
    const square = dx * dx + dy * dy;
    const along = square > 0 ? ((x - ax) * dx + (y - ay) * dy) / square : 0;
    const t = Math.min(Math.max(along, 0), 1);
    least = Math.min(least, Math.hypot(x - ax - t * dx, y - ay - t * dy));
    const arc = outline.arcs[i];
    if (!arc) return;
    const [cx, cy] = arc.centre;
    if (withinArc(arc, Math.atan2(y - cy, x - cx))) {
      least = Math.min(least, Math.abs(Math.hypot(x - cx, y - cy) - arc.radius));
    }
  });
  return least;
}

function betweenCornerAndArc(corner: Vec2, arc: CornerArc, point: Vec2): boolean {
  if (Math.hypot(point[0] - arc.centre[0], point[1] - arc.centre[1]) <= arc.radius) return false;
  const triangle = [corner, pointOnArc(arc, Math.abs(arc.sweep)), pointOnArc(arc, 0)];
  const sides = triangle.map(([ax, ay], i) => {
    const [bx, by] = triangle[(i + 1) % 3]!;
    return (bx - ax) * (point[1] - ay) - (by - ay) * (point[0] - ax);
  });
  return sides.every((side) => side >= 0) || sides.every((side) => side <= 0);
}
