import { toTank, type Placing } from './placing';
import type { Shape, Vec2 } from './shape';
import { shapeFaces } from './shape-faces';
import { unitedOutline } from './united-outline';
import { dot, type Vec3 } from './vec3';

/**
 * The outline of a placed shape as it is seen, mm along `right` and `up` (unit vectors of the tank's frame, square to
 * each other), as loops with the shape on their left. As exact as its faces; needs no library. Followed are
 * the edges between faces that look at the eye and others: they go round a place as often as such faces lie over it.
 */
export function seenOutline(
  shape: Exclude<Shape, { form: 'revolution' }>,
  place: Placing,
  right: Vec3,
  up: Vec3,
): Vec2[][] {
  const { points, faces } = shapeFaces(shape);
  const seen = points.map((own): Vec2 => {
    const point = toTank(place, own);
    return [dot(right, point), dot(up, point)];
  });
  const edges = new Map<number, readonly [number, number]>();
  for (const face of faces) {
    if (!(areaOf(face, seen) > 1e-9)) continue;
    face.forEach((a, i) => {
      const b = face[(i + 1) % face.length]!;
      if (!edges.delete(b * points.length + a)) edges.set(a * points.length + b, [a, b]);
    });
  }
  return unitedOutline([...edges.values()].map(([a, b]) => [seen[a]!, seen[b]!]));
}

function areaOf(face: readonly number[], seen: readonly Vec2[]): number {
  const [x, y] = seen[face[0]!]!;
  let twice = 0;
  for (let i = 1; i + 1 < face.length; i += 1) {
    const [a, b] = [seen[face[i]!]!, seen[face[i + 1]!]!];
    twice += (a[0] - x) * (b[1] - y) - (a[1] - y) * (b[0] - x);
  }
  return twice / 2;
}
