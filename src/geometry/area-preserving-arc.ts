import type { Vec2 } from './shape';

/**
 * An arc of radius 1 from (1, 0) on against the clock over `angle` radians as `chords` chords that enclose exactly
 * its sector's area, ends on the tangents of the arc: its points, one more than chords. All corners stand at one
 * radius q over equal steps δ, but the first and the last chord end where they meet the tangent, at
 * y = (q − 1) / tan(δ/2) along it. Sector of the chords, less the two triangles beyond the tangents:
 * ½ n q² sin δ − (q − 1)² cot(δ/2) = ½ n δ, a quadratic in q − 1. So the arc joins straight sides and other arcs
 * without a step, and parts of the area err only as chords⁻³. Wants δ ≤ π/8.
 */
export function areaPreservingArc(chords: number, angle: number): Vec2[] {
  const step = angle / chords;
  const sine = Math.sin(step);
  const a = chords * sine - 2 / Math.tan(step / 2);
  const b = 2 * chords * sine;
  const c = chords * (sine - step);
  const beyond = (-2 * c) / (b + Math.sqrt(b * b - 4 * a * c));
  const along = beyond / Math.tan(step / 2);
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const points: Vec2[] = [[1, along]];
  for (let k = 1; k < chords; k += 1) {
    points.push([(1 + beyond) * Math.cos(k * step), (1 + beyond) * Math.sin(k * step)]);
  }
  points.push([cos + along * sin, sin - along * cos]);
  return points;
}

/** An arc shorter than this many mm a chord is drawn with fewer chords: its corners would fall together. */
const shortestChordMm = 1e-3;

/**
 * Chords of an arc where a full turn has `facets` (a multiple of 16): in proportion to its angle, rounded up to
 * sixteenths of a turn, so that they double with the facets.
 */
export function arcChords(radiusMm: number, angle: number, facets: number): number {
  const sixteenths = Math.max(1, Math.ceil((8 * angle) / Math.PI - 1e-9));
  const chords = sixteenths * Math.max(1, Math.round(facets / 16));
  return Math.max(sixteenths, Math.min(chords, Math.floor((radiusMm * angle) / shortestChordMm)));
}
