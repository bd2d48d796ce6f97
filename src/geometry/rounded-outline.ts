import type { Vec2 } from './shape';

/**
 * A flat outline, once round against the clock, that does not cross itself, mm. A corner with a radius above 0 is
 * replaced by the arc that touches both of its sides; the arcs of a side's two corners must fit on it.
 */
export interface RoundedOutline {
  corners: readonly Vec2[];
  /** One a corner; 0 leaves it sharp. */
  radii: readonly number[];
}

/** The arc that rounds a corner. */
export interface CornerArc {
  centre: Vec2;
  radius: number;
  /** Direction from the centre in which it begins, radians. */
  start: number;
  /** How far it goes on, radians; against the clock (above 0) on a corner that stands out, with it on one that goes in. */
  sweep: number;
  /** From the corner to where the arc touches either side, mm. */
  reach: number;
}

/** By corner, the arc that rounds it; null where it is sharp. */
export function cornerArcs({ corners, radii }: RoundedOutline): (CornerArc | null)[] {
  return corners.map((corner, i) => {
    const radius = radii[i]!;
    if (radius === 0) return null;
    const [ux, uy] = directionInto(corners, i);
    const sweep = turnAt(corners, i);
    const side = Math.sign(sweep);
    const reach = radius * Math.tan(Math.abs(sweep) / 2);
    const centre = [
      corner[0] - reach * ux - side * radius * uy,
      corner[1] - reach * uy + side * radius * ux,
    ] as const;
    return { centre, radius, start: Math.atan2(-side * ux, side * uy), sweep, reach };
  });
}

/** How much the outline turns at a corner, radians, −π … π, above 0 against the clock. */
export function turnAt(corners: readonly Vec2[], i: number): number {
  const [ux, uy] = directionInto(corners, i);
  const [vx, vy] = directionInto(corners, (i + 1) % corners.length);
  return Math.atan2(ux * vy - uy * vx, ux * vx + uy * vy);
}

/** Point of an arc's circle, `turned` radians on from where it begins (of its own direction of travel). */
export function pointOnArc({ centre, radius, start, sweep }: CornerArc, turned: number): Vec2 {
  const angle = start + Math.sign(sweep) * turned;
  return [centre[0] + radius * Math.cos(angle), centre[1] + radius * Math.sin(angle)];
}

/** Whether a direction from an arc's centre, radians, lies within the arc. */
export function withinArc({ start, sweep }: CornerArc, angle: number): boolean {
  const on = (angle - start) * Math.sign(sweep);
  return on - 2 * Math.PI * Math.floor(on / (2 * Math.PI)) <= Math.abs(sweep);
}

/** Unit vector along the side that ends at a corner. */
function directionInto(corners: readonly Vec2[], i: number): Vec2 {
  const [x0, y0] = corners[(i + corners.length - 1) % corners.length]!;
  const [x1, y1] = corners[i]!;
  const length = Math.hypot(x1 - x0, y1 - y0);
  return [(x1 - x0) / length, (y1 - y0) / length];
}
