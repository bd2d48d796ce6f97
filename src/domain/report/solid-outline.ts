import { looksConvex } from '../../geometry/looks-convex';
import { seenOutline } from '../../geometry/seen-outline';
import { highestLevel, placedShape, type PlacedSolid } from '../tank/placed-solid';
import type { Vec3 } from '../tank/solid';

type Point = readonly [number, number];

/**
 * The outline of one solid as it is seen, mm along x (`across` 0, from the side) or y (1, from the end) and up, as
 * loops with the solid on their left. Exact where all faces are flat. A round convex one is felt in
 * `directions` directions, within about 4/directions² of its size; any other has chords like a circle of `facets`.
 */
export function solidOutline(
  solid: PlacedSolid,
  across: 0 | 1,
  { directions, facets }: { directions: number; facets: number },
): readonly (readonly Point[])[] {
  const right: Vec3 = across === 0 ? [1, 0, 0] : [0, 1, 0];
  if (solid.kind.curved(solid.solid) !== false) {
    // whether it is convex shows with few facets too, and costs little
    if (looksConvex(placedShape(solid, 4).shape)) return [felt(solid, across, directions)];
  }
  const { shape, place } = placedShape(solid, facets);
  if (shape.form === 'revolution') return [felt(solid, across, directions)];
  return seenOutline(shape, place, right, [0, 0, 1]);
}

interface Feeler {
  c: number;
  s: number;
  up: Vec3;
}

const feelersBy = new Map<string, readonly Feeler[]>();

function feelers(count: number, across: 0 | 1): readonly Feeler[] {
  const key = `${count} ${across}`;
  const known = feelersBy.get(key);
  if (known) return known;
  const made = Array.from({ length: count }, (_, i): Feeler => {
    const angle = (2 * Math.PI * i) / count;
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    return { c, s, up: across === 0 ? [c, 0, s] : [0, c, s] };
  });
  feelersBy.set(key, made);
  return made;
}

/** Where neighbouring tangents meet: the corners, each once. */
function felt(solid: PlacedSolid, across: 0 | 1, count: number): Point[] {
  const all = feelers(count, across);
  const reaches = all.map(({ up }) => highestLevel(solid, up));
  const points: Point[] = [];
  all.forEach((a, i) => {
    const next = (i + 1) % count;
    const b = all[next]!;
    const [reachA, reachB] = [reaches[i]!, reaches[next]!];
    const det = a.c * b.s - a.s * b.c;
    const x = (reachA * b.s - reachB * a.s) / det;
    const y = (a.c * reachB - b.c * reachA) / det;
    const last = points.at(-1);
    if (last === undefined || Math.hypot(last[0] - x, last[1] - y) > 1e-6) points.push([x, y]);
  });
  return points;
}
