import { insideOutline } from './inside-outline';
import type { Interval } from './intervals';
import { insideStretches, lineInOutline } from './line-in-outline';
import type { Line } from './line';
import { between, patchOf, type Loft } from './loft';
import { quadraticRoots } from './quadratic-roots';
import type { Vec2 } from './shape';
import { along, cross, dot, type Vec3 } from './vec3';

/** Nearer to the line than this, the way of a corner parts it. mm */
const nearMm = 1e-5;

/**
 * The stretches of a line inside a loft, ascending, its surface included within `slack` mm (measured in the section;
 * below 0: left out). Closed form: the line is parted where it meets sections, patches (a quadratic each) and ways of
 * corners, and the section at the middle of each part tells whether it is inside.
 */
export function lineInLoft(line: Line, loft: Loft, slack: number): Interval[] {
  const { origin, direction } = line;
  const [low, high] = [loft.x[0]!, loft.x.at(-1)!];
  if (Math.abs(direction[0]) < 1e-12) {
    const x = origin[0];
    if (x < low - slack || x > high + slack) return [];
    return lineInOutline(
      outlineAt(loft, x),
      [origin[1], origin[2]],
      [direction[1], direction[2]],
      slack,
    );
  }
  const places = loft.x.map((x) => (x - origin[0]) / direction[0]);
  const [start, end] = [Math.min(places[0]!, places.at(-1)!), Math.max(places[0]!, places.at(-1)!)];
  loft.x.slice(1).forEach((_, i) => {
    loft.sections[i]!.forEach((_corner, j) => {
      places.push(...meetings(line, patchOf(loft, i, j), slack));
    });
  });
  const ascending = places.filter((t) => t >= start && t <= end).sort((a, b) => a - b);
  return insideStretches(ascending, (t) => {
    const [x, y, z] = along(origin, direction, t);
    return insideOutline(outlineAt(loft, x), [y, z], slack);
  });
}

function outlineAt({ x, sections }: Loft, place: number) {
  const at = Math.min(Math.max(place, x[0]!), x.at(-1)!);
  const i = Math.max(
    1,
    x.findIndex((section) => section >= at),
  );
  const share = (at - x[i - 1]!) / (x[i]! - x[i - 1]!);
  const corners = between(sections[i - 1]!, sections[i]!, share);
  return { corners, arcs: corners.map(() => null) };
}

/** Where a line meets a patch or passes near the straight sides of it that run along x. */
function meetings(line: Line, [a, b, c, d]: readonly [Vec3, Vec3, Vec3, Vec3], slack: number) {
  const { origin, direction } = line;
  const length = d[0] - a[0];
  // share of the way along x, as s0 + s1 t
  const [s0, s1] = [(origin[0] - a[0]) / length, direction[0] / length];
  // side and place of the line against its first corner, in the section, both linear in t
  const flat = ([, y, z]: Vec3): Vec2 => [y, z];
  const [fa, fb, fc, fd] = [flat(a), flat(b), flat(c), flat(d)];
  const side = linear(minus(fb, fa), minus(fc, fd), s0, s1);
  const first = linear(fa, fd, s0, s1);
  const off = {
    start: minus(flat(origin), first.start),
    rate: minus(flat(direction), first.rate),
  };
  const found = quadraticRoots(
    area(side.rate, off.rate),
    area(side.start, off.rate) + area(side.rate, off.start),
    area(side.start, off.start),
  ).filter((t) => {
    const on = [0, 1].map((k) => side.start[k]! + t * side.rate[k]!) as [number, number];
    const at = [0, 1].map((k) => off.start[k]! + t * off.rate[k]!) as [number, number];
    const share = (on[0] * at[0] + on[1] * at[1]) / (on[0] * on[0] + on[1] * on[1]);
    return share > -1e-3 && share < 1.001;
  });
  const way: Vec3 = [d[0] - a[0], d[1] - a[1], d[2] - a[2]];
  const square = cross(direction, way);
  const size = dot(square, square);
  if (size > 1e-20 * dot(way, way)) {
    const between: Vec3 = [a[0] - origin[0], a[1] - origin[1], a[2] - origin[2]];
    if (Math.abs(dot(between, square)) < (nearMm + Math.abs(slack)) * Math.sqrt(size)) {
      found.push(dot(cross(between, way), square) / size);
    }
  }
  return found;
}

function linear(low: Vec2, high: Vec2, s0: number, s1: number) {
  const rate = minus(high, low);
  return {
    start: [low[0] + s0 * rate[0], low[1] + s0 * rate[1]] as const,
    rate: [s1 * rate[0], s1 * rate[1]] as const,
  };
}

function minus(a: Vec2, b: Vec2): Vec2 {
  return [a[0] - b[0], a[1] - b[1]];
}

function area(a: Vec2, b: Vec2): number {
  return a[0] * b[1] - a[1] * b[0];
}
