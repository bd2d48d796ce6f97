import type { Vec2 } from './shape';

export type FlatTriangle = readonly [Vec2, Vec2, Vec2];

/**
 * Where two triangles of one plane overlap, as a convex polygon; null when they only touch or part (an
 * overlap of less than 1e-6 of the smaller one's area). Sutherland and Hodgman's clipping, in any unit.
 */
export function overlapOf(one: FlatTriangle, other: FlatTriangle): readonly Vec2[] | null {
  const clip = area(other) < 0 ? [other[0], other[2], other[1]] : other;
  let polygon: Vec2[] = [...one];
  for (let side = 0; side < 3; side += 1) {
    const a = clip[side]!;
    const b = clip[(side + 1) % 3]!;
    const inside = (p: Vec2) => (b[0] - a[0]) * (p[1] - a[1]) - (b[1] - a[1]) * (p[0] - a[0]);
    const kept: Vec2[] = [];
    polygon.forEach((p, i) => {
      const q = polygon[(i + 1) % polygon.length]!;
      const dp = inside(p);
      const dq = inside(q);
      if (dp >= 0) kept.push(p);
      if (dp * dq < 0) {
        const t = dp / (dp - dq);
        kept.push([p[0] + t * (q[0] - p[0]), p[1] + t * (q[1] - p[1])]);
      }
    });
    polygon = kept;
  }
  const least = 1e-6 * Math.min(Math.abs(area(one)), Math.abs(area(other)));
  return polygon.length >= 3 && Math.abs(area(polygon)) > least ? polygon : null;
}

function area(polygon: readonly Vec2[]): number {
  let twice = 0;
  polygon.forEach(([x, y], i) => {
    const [x2, y2] = polygon[(i + 1) % polygon.length]!;
    twice += x * y2 - x2 * y;
  });
  return twice / 2;
}
