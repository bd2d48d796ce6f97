import { arcChords, areaPreservingArc } from './area-preserving-arc';
import { cornerArcs, type RoundedOutline } from './rounded-outline';
import type { Vec2 } from './shape';
import { samePlaceMm } from './tolerance';

export interface OutlinePolygon {
  points: Vec2[];
  /** By side (from a point to the next): whether it is a straight side of the outline, not a chord of an arc. */
  straight: boolean[];
}

/** A rounded outline as a polygon of exactly its area, its arcs as chords, `facets` to a full turn. */
export function outlinePolygon(outline: RoundedOutline, facets: number): OutlinePolygon {
  const { corners } = outline;
  const arcs = cornerArcs(outline);
  const points: Vec2[] = [];
  const straight: boolean[] = [];
  corners.forEach((corner, i) => {
    const j = (i + 1) % corners.length;
    const arc = arcs[i];
    if (arc) {
      const { centre, radius, start, sweep } = arc;
      const side = Math.sign(sweep);
      const [cos, sin] = [radius * Math.cos(start), radius * Math.sin(start)];
      const angle = Math.abs(sweep);
      for (const [x, y] of areaPreservingArc(arcChords(radius, angle, facets), angle)) {
        points.push([centre[0] + x * cos - side * y * sin, centre[1] + x * sin + side * y * cos]);
        straight.push(false);
      }
    } else {
      points.push(corner);
      straight.push(false);
    }
    // of two arcs that meet, what the chords leave straight between them is a chord as well
    const [next, nextArc] = [corners[j]!, arcs[j]];
    const length = Math.hypot(next[0] - corner[0], next[1] - corner[1]);
    straight[points.length - 1] = length - (arc?.reach ?? 0) - (nextArc?.reach ?? 0) > samePlaceMm;
  });
  return { points, straight };
}
