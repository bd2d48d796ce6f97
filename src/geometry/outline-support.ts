import { cornerArcs, pointOnArc, withinArc, type RoundedOutline } from './rounded-outline';
import type { Vec2 } from './shape';

/** Greatest a·x + b·y over a rounded outline; exact. Its corners, the ends of its arcs and their tops come into question. */
export function outlineSupport(outline: RoundedOutline, [a, b]: Vec2): number {
  const arcs = cornerArcs(outline);
  let most = -Infinity;
  outline.corners.forEach((corner, i) => {
    const arc = arcs[i];
    const points = arc ? [pointOnArc(arc, 0), pointOnArc(arc, Math.abs(arc.sweep))] : [corner];
    for (const [x, y] of points) most = Math.max(most, a * x + b * y);
    if (arc && arc.sweep > 0 && withinArc(arc, Math.atan2(b, a))) {
      most = Math.max(most, a * arc.centre[0] + b * arc.centre[1] + arc.radius * Math.hypot(a, b));
    }
  });
  return most;
}
