import { dishSphere, headDepth, knuckleAngle, type Head } from './head';
import type { Interval } from './intervals';
import { lineInHalfSpaces, lineInQuadric, type Line } from './line';
import { lineInFrustum } from './line-in-frustum';
import { samePlaceMm } from './tolerance';
import { along } from './vec3';

/**
 * The stretch of a line inside an end: between the barrel's mouth (the disc of its radius in the plane z = 0) and
 * its surface, which is included within `slack` mm. The mouth itself is a seam, not a surface: a line in it counts
 * as inside. Closed form but for a knuckle, whose ends are bisected to the last bit. Null when the line misses it.
 */
export function lineInHead(line: Line, head: Head, slack: number): Interval | null {
  const { radius } = head;
  switch (head.form) {
    case 'flat':
      return null;
    case 'cone': {
      const { depth } = head;
      if (inMouth(line)) return lineInQuadric(line, [radius, radius, Infinity], slack);
      const frustum = { axis: 'z', start: radius, end: 0, length: depth } as const;
      return lineInFrustum(lowered(line, depth / 2), frustum, slack);
    }
    case 'dish': {
      const sphere = dishSphere(head);
      const round = lineInQuadric(
        lowered(line, head.depth - sphere),
        [sphere, sphere, sphere],
        slack,
      );
      return both(round, above(line, 0));
    }
    case 'ellipsoid':
      return both(lineInQuadric(line, [radius, radius, head.depth], slack), above(line, 0));
    case 'torisphere':
      return lineInTorisphere(line, head, slack);
  }
}

function lineInTorisphere(
  line: Line,
  head: Extract<Head, { form: 'torisphere' }>,
  slack: number,
): Interval | null {
  const { radius, crown, knuckle } = head;
  const jointPlace = knuckle * Math.cos(knuckleAngle(head));
  const sphere = lineInQuadric(
    lowered(line, headDepth(head) - crown),
    [crown, crown, crown],
    slack,
  );
  const cap = both(sphere, above(line, jointPlace));
  const ring = both(above(line, 0), below(line, jointPlace));
  const inRing = ring && lineInRing(line, ring, radius - knuckle, knuckle, slack);
  if (!cap || !inRing) return cap ?? inRing;
  // the end is convex: what is inside is one stretch
  return { from: Math.min(cap.from, inRing.from), to: Math.max(cap.to, inRing.to) };
}

/**
 * Inside is r − off − √(knuckle² − z²) ≤ 0, and both terms are convex along a line: its least is found first, by the
 * sign of its slope, then an end on either side.
 */
function lineInRing(
  line: Line,
  within: Interval,
  off: number,
  knuckle: number,
  slack: number,
): Interval | null {
  const [dx, dy, dz] = line.direction;
  const height = (z: number) => Math.sqrt(Math.max((knuckle - z) * (knuckle + z), 0));
  if (Math.abs(dz) < 1e-12) {
    const radius = off + height(line.origin[2]);
    return lineInQuadric(line, [radius, radius, Infinity], slack);
  }
  const outside = (t: number) => {
    const [x, y, z] = along(line.origin, line.direction, t);
    return Math.hypot(x, y) - off - height(z);
  };
  const rises = (t: number) => {
    const [x, y, z] = along(line.origin, line.direction, t);
    const r = Math.hypot(x, y);
    // multiplied by r and by the height, both positive
    return (x * dx + y * dy) * height(z) + z * dz * r > 0;
  };
  const lowest = turningPoint(within.from, within.to, rises);
  const least = outside(lowest);
  if (least > 0) return least <= slack ? { from: lowest, to: lowest } : null;
  return {
    from:
      outside(within.from) <= 0
        ? within.from
        : turningPoint(within.from, lowest, (t) => outside(t) <= 0),
    to:
      outside(within.to) <= 0 ? within.to : turningPoint(lowest, within.to, (t) => outside(t) > 0),
  };
}

/** Where, between `from` and `to`, a statement becomes true. */
function turningPoint(from: number, to: number, isPast: (t: number) => boolean): number {
  for (let halvings = 0; halvings < 100; halvings += 1) {
    const middle = (from + to) / 2;
    if (middle <= from || middle >= to) break;
    if (isPast(middle)) to = middle;
    else from = middle;
  }
  return (from + to) / 2;
}

function inMouth({ origin, direction }: Line): boolean {
  return Math.abs(direction[2]) < 1e-12 && Math.abs(origin[2]) <= samePlaceMm;
}

function above(line: Line, place: number): Interval | null {
  return lineInHalfSpaces(line, [{ normal: [0, 0, -1], offset: -place }], samePlaceMm);
}

function below(line: Line, place: number): Interval | null {
  return lineInHalfSpaces(line, [{ normal: [0, 0, 1], offset: place }], samePlaceMm);
}

function lowered({ origin: [x, y, z], direction }: Line, by: number): Line {
  return { origin: [x, y, z - by], direction };
}

function both(one: Interval | null, other: Interval | null): Interval | null {
  if (!one || !other) return null;
  const from = Math.max(one.from, other.from);
  const to = Math.min(one.to, other.to);
  return to >= from ? { from, to } : null;
}
