import { insideOutline, sideOf, type OutlineParts } from './inside-outline';
import type { Interval } from './intervals';
import type { Vec2 } from './shape';

/** Longer than any line inside a document's bounds. mm */
const farMm = 1e7;

/** Nearer to the line than this, a corner parts it, however the line runs along its sides. mm */
const nearMm = 1e-5;

/**
 * The stretches of a line origin + t·direction of the outline's plane inside it, ascending, in units of t. Closed
 * form: sides, arcs and corners part the line, and the middle of each part tells whether it is inside; for `slack`
 * see insideOutline. A direction of no length stands for a line square to the plane.
 */
export function lineInOutline(
  outline: OutlineParts,
  origin: Vec2,
  direction: Vec2,
  slack: number,
): Interval[] {
  const speed = Math.hypot(direction[0], direction[1]);
  if (speed < 1e-12) {
    return insideOutline(outline, origin, slack) ? [{ from: -farMm, to: farMm }] : [];
  }
  const ascending = crossings(outline, origin, direction, speed, slack).sort((a, b) => a - b);
  return insideStretches(ascending, (t) =>
    insideOutline(outline, [origin[0] + t * direction[0], origin[1] + t * direction[1]], slack),
  );
}

/** The stretches between ascending places of a line whose middles are inside, those that meet made one. */
export function insideStretches(
  ascending: readonly number[],
  inside: (t: number) => boolean,
): Interval[] {
  const stretches: Interval[] = [];
  for (let i = 1; i < ascending.length; i += 1) {
    const [from, to] = [ascending[i - 1]!, ascending[i]!];
    if (to <= from || !inside((from + to) / 2)) continue;
    const last = stretches.at(-1);
    if (last?.to === from) last.to = to;
    else stretches.push({ from, to });
  }
  return stretches;
}

function crossings(
  outline: OutlineParts,
  [ox, oy]: Vec2,
  [dx, dy]: Vec2,
  speed: number,
  slack: number,
): number[] {
  const near = nearMm + Math.abs(slack);
  const found: number[] = [];
  outline.corners.forEach((_, i) => {
    const [[ax, ay], [bx, by]] = sideOf(outline, i);
    const [px, py] = [ax - ox, ay - oy];
    const [sx, sy] = [bx - ax, by - ay];
    const turn = dx * sy - dy * sx;
    if (Math.abs(turn) > 1e-12 * speed * Math.hypot(sx, sy)) {
      const along = (dy * px - dx * py) / turn;
      if (along > -1e-3 && along < 1.001) found.push((px * sy - py * sx) / turn);
    }
    for (const [x, y] of [
      [px, py],
      [bx - ox, by - oy],
    ] as const) {
      if (Math.abs(dx * y - dy * x) / speed < near) found.push((dx * x + dy * y) / speed ** 2);
    }
    const arc = outline.arcs[i];
    if (!arc) return;
    const [x, y] = [arc.centre[0] - ox, arc.centre[1] - oy];
    const middle = (dx * x + dy * y) / speed ** 2;
    const off = (dx * y - dy * x) / speed;
    const half = Math.sqrt(Math.max(arc.radius ** 2 - off * off, 0)) / speed;
    if (Math.abs(off) < arc.radius + near) found.push(middle - half, middle + half);
  });
  return found;
}
