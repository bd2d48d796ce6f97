import type { Vec2 } from './shape';

type Segment = readonly [Vec2, Vec2];

/**
 * The outline of everything that closed, directed loops go round at least once against the clock (loops may cross,
 * touch and lie on each other), mm: loops that do none of that, what is inside on their left. Places are rounded to
 * 1e-7 of the size. Time grows with the square of the segments.
 */
export function unitedOutline(segments: readonly Segment[]): Vec2[][] {
  const grid = gridOf(segments);
  if (grid === 0) return [];
  const round = (value: number) => Math.round(value / grid) * grid;
  const drawn = segments
    .map(([a, b]): Segment => [
      [round(a[0]), round(a[1])],
      [round(b[0]), round(b[1])],
    ])
    .filter(([a, b]) => !same(a, b));
  const pieces = new Map<number, Piece>();
  const nodes = new Map<string, number>();
  const node = (point: Vec2) => {
    const name = key(point);
    const known = nodes.get(name);
    if (known !== undefined) return known;
    nodes.set(name, nodes.size);
    return nodes.size - 1;
  };
  const byX = [...drawn].sort((one, other) => leastOf(one, 0) - leastOf(other, 0));
  for (const segment of drawn) {
    const cuts = cutsOf(segment, byX, grid);
    cuts.slice(1).forEach((to, i) => {
      const [a, b] = [at(segment, cuts[i]!), at(segment, to)].map(([x, y]): Vec2 => [
        round(x),
        round(y),
      ]) as [Vec2, Vec2];
      if (!same(a, b)) gather(pieces, { a, b, net: 1 }, node(a), node(b));
    });
  }
  const byY = [...drawn].sort((one, other) => leastOf(one, 1) - leastOf(other, 1));
  const rim: Segment[] = [];
  for (const { a, b, net } of pieces.values()) {
    if (net === 0) continue;
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
    const [dx, dy] = [(4 * grid * (b[1] - a[1])) / length, (-4 * grid * (b[0] - a[0])) / length];
    const right = timesRound(byY, (a[0] + b[0]) / 2 + dx, (a[1] + b[1]) / 2 + dy);
    // to the left of what runs along it one goes round once more
    const left = right + net;
    if (left > 0 && right <= 0) rim.push([a, b]);
    else if (right > 0 && left <= 0) rim.push([b, a]);
  }
  return loopsOf(rim, grid).map(withoutStraightOnes);
}

/** A stretch that no other crosses, and how many more segments run from a to b than back. */
interface Piece {
  a: Vec2;
  b: Vec2;
  net: number;
}

function gather(pieces: Map<number, Piece>, piece: Piece, a: number, b: number): void {
  const [forth, back] = [a * 2 ** 25 + b, b * 2 ** 25 + a];
  const known = pieces.get(forth);
  const against = pieces.get(back);
  if (known) known.net += 1;
  else if (against) against.net -= 1;
  else pieces.set(forth, piece);
}

/** How many times segments that close go round a place, against the clock; segments in order of their least y. */
function timesRound(byY: readonly Segment[], x: number, y: number): number {
  let times = 0;
  for (const segment of byY) {
    const a = segment[0];
    const b = segment[1];
    if (a[1] > y && b[1] > y) break;
    if (a[1] <= y === b[1] <= y) continue;
    const beside = (b[0] - a[0]) * (y - a[1]) - (b[1] - a[1]) * (x - a[0]);
    if (b[1] > a[1]) {
      if (beside > 0) times += 1;
    } else if (beside < 0) times -= 1;
  }
  return times;
}

function leastOf([a, b]: Segment, axis: 0 | 1): number {
  return Math.min(a[axis], b[axis]);
}

function gridOf(segments: readonly Segment[]): number {
  let [low, high] = [Infinity, -Infinity];
  let [lowY, highY] = [Infinity, -Infinity];
  for (const [[x, y]] of segments) {
    [low, high] = [Math.min(low, x), Math.max(high, x)];
    [lowY, highY] = [Math.min(lowY, y), Math.max(highY, y)];
  }
  return segments.length === 0 ? 0 : 1e-7 * Math.max(high - low, highY - lowY);
}

/** Where others cross, touch or leave a segment, as shares of it in order, its ends included; others in order of their least x. */
function cutsOf(segment: Segment, byX: readonly Segment[], grid: number): number[] {
  const [[ax, ay], [bx, by]] = segment;
  const [ux, uy] = [bx - ax, by - ay];
  const length = Math.hypot(ux, uy);
  const near = 2 * grid;
  const cuts: number[] = [];
  const [lowX, highX] = [Math.min(ax, bx) - near, Math.max(ax, bx) + near];
  const [lowY, highY] = [Math.min(ay, by) - near, Math.max(ay, by) + near];
  for (const other of byX) {
    const px = other[0][0];
    const py = other[0][1];
    const qx = other[1][0];
    const qy = other[1][1];
    if (px > highX && qx > highX) break;
    if ((px < lowX && qx < lowX) || (py < lowY && qy < lowY) || (py > highY && qy > highY))
      continue;
    // distances of the other's ends from this segment's line
    const p = (ux * (py - ay) - uy * (px - ax)) / length;
    const q = (ux * (qy - ay) - uy * (qx - ax)) / length;
    const along = (x: number, y: number) => (ux * (x - ax) + uy * (y - ay)) / length ** 2;
    if (Math.abs(p) <= near) cuts.push(along(px, py));
    if (Math.abs(q) <= near) cuts.push(along(qx, qy));
    if (Math.abs(p) > near && Math.abs(q) > near && p > 0 !== q > 0) {
      const t = p / (p - q);
      cuts.push(along(px + t * (qx - px), py + t * (qy - py)));
    }
  }
  const end = near / length;
  const inner = cuts.filter((cut) => cut > end && cut < 1 - end).sort((a, b) => a - b);
  return [0, ...inner.filter((cut, i) => i === 0 || cut - inner[i - 1]! > 1e-12), 1];
}

/** Segments one after the other; an end that rounding has moved goes on at the nearest start. */
function loopsOf(rim: readonly Segment[], grid: number): Vec2[][] {
  const from = new Map<string, Segment[]>();
  for (const segment of rim) {
    const start = key(segment[0]);
    from.set(start, [...(from.get(start) ?? []), segment]);
  }
  const left = new Set(rim);
  const loops: Vec2[][] = [];
  for (const first of rim) {
    if (!left.delete(first)) continue;
    const loop = [first[0]];
    let end = first[1];
    while (!same(end, first[0])) {
      const next =
        from.get(key(end))?.find((segment) => left.has(segment)) ?? nearest(end, first[0]);
      if (!next) break;
      left.delete(next);
      loop.push(next[0]);
      end = next[1];
    }
    if (loop.length > 2) loops.push(loop);
  }
  return loops;

  function nearest([x, y]: Vec2, start: Vec2): Segment | undefined {
    let best: Segment | undefined;
    let least = Math.min(1e4 * grid, Math.hypot(start[0] - x, start[1] - y));
    for (const segment of left) {
      const far = Math.hypot(segment[0][0] - x, segment[0][1] - y);
      if (far < least) [best, least] = [segment, far];
    }
    return best;
  }
}

function withoutStraightOnes(loop: readonly Vec2[]): Vec2[] {
  return loop.filter(([x, y], i) => {
    const [ax, ay] = loop[(i + loop.length - 1) % loop.length]!;
    const [bx, by] = loop[(i + 1) % loop.length]!;
    const turn = (x - ax) * (by - y) - (y - ay) * (bx - x);
    const forth = (x - ax) * (bx - x) + (y - ay) * (by - y);
    return (
      forth < 0 || Math.abs(turn) > 1e-5 * Math.hypot(x - ax, y - ay) * Math.hypot(bx - x, by - y)
    );
  });
}

function at([a, b]: Segment, t: number): Vec2 {
  if (t === 0) return a;
  return t === 1 ? b : [a[0] + t * (b[0] - a[0]), a[1] + t * (b[1] - a[1])];
}

function same(a: Vec2, b: Vec2): boolean {
  return a[0] === b[0] && a[1] === b[1];
}

function key([x, y]: Vec2): string {
  return `${x},${y}`;
}
