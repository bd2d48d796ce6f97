import type { Vec3 } from '~/domain/tank/solid';

/**
 * The draughtsman's "drawn away" view: the front plane (x right, z up) at true scale, so that
 * heights can be read off against the stick; y runs away to the upper right, shortened.
 */
export interface Oblique {
  /** How much of a millimetre of y shows to the right and upward. */
  away: readonly [right: number, up: number];
}

export const drawnAway: Oblique = { away: [0.16, 0.06] };

/** A point of the tank's frame (mm) on the drawing (mm right, mm up). */
export function project(view: Oblique, p: Vec3): [number, number] {
  return [p[0] + view.away[0] * p[1], p[2] + view.away[1] * p[1]];
}

/** Whether a face with this outward normal looks at the reader. */
export function faces(view: Oblique, normal: Vec3): boolean {
  return normal[1] - view.away[0] * normal[0] - view.away[1] * normal[2] < 0;
}
