import { cornerArcs, type RoundedOutline } from './rounded-outline';
import type { Vec2 } from './shape';

/** Area of a polygon, mm²; above 0 when it runs against the clock (the surveyor's formula, about its first corner). */
export function polygonArea(corners: readonly Vec2[]): number {
  const [x0, y0] = corners[0]!;
  let twice = 0;
  for (let i = 1; i + 1 < corners.length; i += 1) {
    const [ax, ay] = corners[i]!;
    const [bx, by] = corners[i + 1]!;
    twice += (ax - x0) * (by - y0) - (ay - y0) * (bx - x0);
  }
  return twice / 2;
}

/**
 * Area of a rounded outline, mm². Between a corner and its arc lie the kite of corner, centre and the two points
 * of touch, r² tan(φ/2), less the sector, r² φ/2: lost where the corner stands out, gained where it goes in.
 */
export function outlineArea(outline: RoundedOutline): number {
  return cornerArcs(outline).reduce((area, arc) => {
    if (!arc) return area;
    const between = arc.radius * (arc.reach - (arc.radius * Math.abs(arc.sweep)) / 2);
    return area - Math.sign(arc.sweep) * between;
  }, polygonArea(outline.corners));
}
