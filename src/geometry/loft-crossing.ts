import { quadraticRoots } from './quadratic-roots';
import type { Vec2 } from './shape';
import { thinMm } from './tolerance';

/** A corner that meets a side somewhere between two sections, and where: 0 at the first, 1 at the second. */
export interface Crossing {
  corner: number;
  /** From this corner to the next. */
  side: number;
  share: number;
}

/**
 * Where the polygon between two sections that do not cross themselves begins to: the first corner that comes upon a
 * side it does not end, as far as found; null when none does. A corner lies on a side's line where
 * a quadratic of the share is 0. Sides that shrink to less than 0.01 mm on the way count as crossing.
 */
export function crossingBetween(low: readonly Vec2[], high: readonly Vec2[]): Crossing | null {
  const n = low.length;
  const run = (j: number): Running => ({ from: low[j % n]!, to: high[j % n]! });
  for (let side = 0; side < n; side += 1) {
    const [a, b] = [run(side), run(side + 1)];
    const closest = nearest(a, b);
    if (closest.mm < thinMm) return { corner: (side + 1) % n, side, share: closest.share };
    for (let corner = 0; corner < n; corner += 1) {
      if (corner === side || corner === (side + 1) % n) continue;
      const share = meeting(a, b, run(corner));
      if (share !== null) return { corner, side, share };
    }
  }
  return null;
}

/** A corner on its straight way from one section to the next. */
interface Running {
  from: Vec2;
  to: Vec2;
}

function meeting(a: Running, b: Running, p: Running): number | null {
  const [side, off] = [apart(a, b), apart(a, p)];
  const square = area(side.rate, off.rate);
  const linear = area(side.start, off.rate) + area(side.rate, off.start);
  const constant = area(side.start, off.start);
  const size = Math.hypot(...side.start, ...side.rate) * Math.hypot(...off.start, ...off.rate);
  if (Math.max(Math.abs(square), Math.abs(linear), Math.abs(constant)) < 1e-14 * size) {
    // on the side's line all the way: then it comes past one of its ends
    const passing = [nearest(a, p), nearest(b, p)].find(({ mm }) => mm < thinMm / 100);
    return passing?.share ?? null;
  }
  const on = quadraticRoots(square, linear, constant).find((share) => {
    if (!(share >= 0 && share <= 1)) return false;
    const [s, o] = [at(side, share), at(off, share)];
    const along = (s[0] * o[0] + s[1] * o[1]) / (s[0] * s[0] + s[1] * s[1]);
    return along >= -1e-9 && along <= 1 + 1e-9;
  });
  return on ?? null;
}

interface Apart {
  start: Vec2;
  rate: Vec2;
}

function apart(a: Running, b: Running): Apart {
  const start = [b.from[0] - a.from[0], b.from[1] - a.from[1]] as const;
  return { start, rate: [b.to[0] - a.to[0] - start[0], b.to[1] - a.to[1] - start[1]] };
}

function at({ start, rate }: Apart, share: number): Vec2 {
  return [start[0] + share * rate[0], start[1] + share * rate[1]];
}

function area(a: Vec2, b: Vec2): number {
  return a[0] * b[1] - a[1] * b[0];
}

/** Least distance of two corners on their way, and where. */
function nearest(a: Running, b: Running): { mm: number; share: number } {
  const way = apart(a, b);
  const { start, rate } = way;
  const speed = rate[0] * rate[0] + rate[1] * rate[1];
  const best = speed === 0 ? 0 : -(start[0] * rate[0] + start[1] * rate[1]) / speed;
  const share = Math.min(Math.max(best, 0), 1);
  return { mm: Math.hypot(...at(way, share)), share };
}
