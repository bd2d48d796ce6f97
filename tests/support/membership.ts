/**
 * Whether a point lies in a tank, straight from the words of the design format: a second way that shares no
 * code with the engine (no mesh, no sweep, no frame, no chord of its). Lengths mm, degrees.
 */
type Point = readonly [number, number, number];
/** A solid of a design document as plain JSON. */
export type PlainSolid = Record<string, unknown> & { kind: string; role: string };
export interface PlainTank {
  solids: readonly PlainSolid[];
  attitude?: { pitch: number; roll: number } | undefined;
}

/** Whether a point of the tank's frame lies in the liquid space. */
export function membership(tank: PlainTank): (p: Point) => boolean {
  const tests = tank.solids.map((solid) => ({
    holds: solid.role === 'holds',
    isIn: membershipOfSolid(solid),
  }));
  return (p) =>
    tests.some(({ holds, isIn }) => holds && isIn(p)) &&
    !tests.some(({ holds, isIn }) => !holds && isIn(p));
}

/** Unit up vector of an attitude. */
export function upByHand({ attitude }: PlainTank): Point {
  const t = (degrees = 0) => Math.tan((degrees * Math.PI) / 180);
  const [x, y, z] = [-t(attitude?.pitch), -t(attitude?.roll), 1];
  const size = Math.hypot(x, y, z);
  return [x / size, y / size, z / size];
}

/** A box of the tank's frame that holds every solid that holds, however turned. */
export function boxAround(tank: PlainTank): { low: number[]; high: number[] } {
  const low = [Infinity, Infinity, Infinity];
  const high = [-Infinity, -Infinity, -Infinity];
  for (const solid of tank.solids.filter(({ role }) => role === 'holds')) {
    const size = extentOf(solid);
    const reach = Math.hypot(...size) / 2;
    const turned = ((solid.turn as number[] | undefined) ?? []).some((angle) => angle !== 0);
    centreOf(solid, size).forEach((value, axis) => {
      const half = turned ? reach : size[axis]! / 2;
      low[axis] = Math.min(low[axis]!, value - half);
      high[axis] = Math.max(high[axis]!, value + half);
    });
  }
  return { low, high };
}

function centreOf(solid: PlainSolid, size: readonly number[]): number[] {
  return ((solid.at as number[] | undefined) ?? [0, 0, 0]).map((v, axis) => v + size[axis]! / 2);
}

function membershipOfSolid(solid: PlainSolid): (p: Point) => boolean {
  const size = extentOf(solid);
  const centre = centreOf(solid, size);
  const inside = ownMembership(solid);
  const turns = ((solid.turn as number[] | undefined) ?? [0, 0, 0]).map((a) => (a * Math.PI) / 180);
  const [cx, cy, cz] = turns.map(Math.cos) as [number, number, number];
  const [sx, sy, sz] = turns.map(Math.sin) as [number, number, number];
  return (p) => {
    // undo z, then y, then x
    let x = p[0] - centre[0]!;
    let y = p[1] - centre[1]!;
    let z = p[2] - centre[2]!;
    [x, y] = [x * cz + y * sz, -x * sz + y * cz];
    [z, x] = [z * cy + x * sy, -z * sy + x * cy];
    [y, z] = [y * cx + z * sx, -y * sx + z * cx];
    const q: Point = [x + size[0]! / 2, y + size[1]! / 2, z + size[2]! / 2];
    return q.every((v, i) => v >= 0 && v <= size[i]!) && inside(q);
  };
}

const number = (solid: PlainSolid, field: string) => solid[field] as number;

/** Lengths of the upright box. */
function extentOf(solid: PlainSolid): number[] {
  const of = (field: string) => number(solid, field);
  const axis = 'xyz'.indexOf(
    (solid.axis as string | undefined) ?? (solid.kind === 'cone' ? 'z' : 'x'),
  );
  switch (solid.kind) {
    case 'cylinder': {
      const size = [of('diameter'), of('diameter'), of('diameter')];
      size[axis] = of('length') + outward(solid, 0) + outward(solid, 1);
      return size;
    }
    case 'oval':
      return axis === 0
        ? [of('length'), of('width'), of('height')]
        : [of('width'), of('length'), of('height')];
    case 'sphere':
      return [of('diameter'), of('diameter'), of('diameter')];
    case 'cone': {
      const widest = Math.max(of('start'), of('end'));
      const size = [widest, widest, widest];
      size[axis] = of('length');
      return size;
    }
    case 'taper': {
      const [b, t, s] = [solid.bottom, solid.top, solid.shift ?? [0, 0]] as number[][];
      const along = (i: number) =>
        Math.max(b![i]! / 2, s![i]! + t![i]! / 2) - Math.min(-b![i]! / 2, s![i]! - t![i]! / 2);
      return [along(0), along(1), of('height')];
    }
    case 'prism': {
      const profile = solid.profile as number[][];
      return [range(profile.map((p) => p[0]!)), of('width'), range(profile.map((p) => p[1]!))];
    }
    case 'stations': {
      const stations = solid.stations as { x: number; profile: number[][] }[];
      const points = stations.flatMap(({ profile }) => profile);
      return [
        range(stations.map(({ x }) => x)),
        range(points.map((p) => p[0]!)),
        range(points.map((p) => p[1]!)),
      ];
    }
    default:
      return [of('length'), of('width'), of('height')];
  }
}

function range(values: readonly number[]): number {
  return Math.max(...values) - Math.min(...values);
}

/** In the box's own coordinates, from its lowest corner; points outside the box are not asked. */
function ownMembership(solid: PlainSolid): (q: Point) => boolean {
  const of = (field: string) => number(solid, field);
  const size = extentOf(solid);
  const axis = 'xyz'.indexOf(
    (solid.axis as string | undefined) ?? (solid.kind === 'cone' ? 'z' : 'x'),
  );
  const [first, second] = [(axis + 1) % 3, (axis + 2) % 3];
  const off = (q: Point, i: number) => q[i]! - size[i]! / 2;
  const fromAxis = (q: Point) => Math.hypot(off(q, first), off(q, second));
  switch (solid.kind) {
    case 'box':
      return roundedBox(solid, size);
    case 'wedge':
      return (q) => q[2] / size[2]! + q[0] / size[0]! <= 1;
    case 'cylinder': {
      const radius = of('diameter') / 2;
      const start = outward(solid, 0);
      return (q) => {
        const rho = fromAxis(q);
        if (rho > radius) return false;
        const s = q[axis]! - start;
        if (s < 0) return inHead(endOf(solid, 0), radius, -s, rho);
        if (s > of('length')) return inHead(endOf(solid, 1), radius, s - of('length'), rho);
        return ![0, 1].some((end) => {
          const head = endOf(solid, end);
          const into = end === 0 ? s : of('length') - s;
          return head.inward === true && inHead(head, radius, into, rho);
        });
      };
    }
    case 'oval':
      return (q) =>
        (off(q, first) / (size[first]! / 2)) ** 2 + (off(q, second) / (size[second]! / 2)) ** 2 <=
        1;
    case 'cone': {
      const [r0, r1] = [of('start') / 2, of('end') / 2];
      return (q) => fromAxis(q) <= r0 + ((r1 - r0) * q[axis]!) / of('length');
    }
    case 'sphere':
    case 'ellipsoid':
      return (q) => [0, 1, 2].reduce((sum, i) => sum + (off(q, i) / (size[i]! / 2)) ** 2, 0) <= 1;
    case 'taper': {
      const [b, t, s] = [solid.bottom, solid.top, solid.shift ?? [0, 0]] as number[][];
      return (q) =>
        [0, 1].every((i) => {
          const least = Math.min(-b![i]! / 2, s![i]! - t![i]! / 2);
          const up = q[2] / of('height');
          const middle = up * s![i]!;
          const half = (b![i]! + up * (t![i]! - b![i]!)) / 2;
          return Math.abs(q[i]! + least - middle) <= half;
        });
    }
    case 'prism': {
      const profile = solid.profile as number[][];
      const low = [0, 1].map((i) => Math.min(...profile.map((p) => p[i]!)));
      return (q) => inRoundedPolygon(profile, q[0] + low[0]!, q[2] + low[1]!);
    }
    case 'stations': {
      const stations = solid.stations as { x: number; profile: number[][] }[];
      const points = stations.flatMap(({ profile }) => profile);
      const low = [0, 1].map((i) => Math.min(...points.map((p) => p[i]!)));
      return (q) => {
        const x = q[0] + stations[0]!.x;
        const next = Math.max(
          1,
          stations.findIndex((one) => one.x >= x),
        );
        const [a, b] = [stations[next - 1]!, stations[next]!];
        const t = (x - a.x) / (b.x - a.x);
        const section = a.profile.map((p, i) => p.map((v, k) => v + t * (b.profile[i]![k]! - v)));
        return inPolygon(section, q[1] + low[0]!, q[2] + low[1]!);
      };
    }
    default:
      throw new Error(`no second way for a ${solid.kind}`);
  }
}

interface End {
  form: string;
  depth?: number;
  crown?: number;
  knuckle?: number;
  inward?: boolean;
}

function endOf(solid: PlainSolid, end: number): End {
  return (solid.ends as End[] | undefined)?.[end] ?? { form: 'flat' };
}

function depthOf(end: End, radius: number): number {
  if (end.form === 'flat') return 0;
  if (end.form !== 'torisphere') return end.depth!;
  const [c, k] = [end.crown!, end.knuckle!];
  return c - Math.sqrt((c - k) ** 2 - (radius - k) ** 2);
}

function outward(solid: PlainSolid, end: number): number {
  const one = endOf(solid, end);
  return one.inward ? 0 : depthOf(one, number(solid, 'diameter') / 2);
}

/** t mm beyond the plane where the end begins, rho from the axis. */
function inHead(end: End, radius: number, t: number, rho: number): boolean {
  const d = depthOf(end, radius);
  if (t > d || d === 0) return false;
  if (end.form === 'cone') return rho <= radius * (1 - t / d);
  if (end.form === 'ellipsoid') return (t / d) ** 2 + (rho / radius) ** 2 <= 1;
  if (end.form === 'dish') {
    const ball = (radius * radius + d * d) / (2 * d);
    return Math.hypot(t - d + ball, rho) <= ball;
  }
  const [c, k] = [end.crown!, end.knuckle!];
  // the arcs meet on the line from the crown's centre through the knuckle's
  const cos = Math.sqrt(1 - ((radius - k) / (c - k)) ** 2);
  if (t <= k * cos) return rho <= radius - k + Math.sqrt(Math.max(k * k - t * t, 0));
  return Math.hypot(t - d + c, rho) <= c;
}

/** Rounded by its greatest radius along that axis, its rims by a ball of the others'. */
function roundedBox(solid: PlainSolid, size: readonly number[]): (q: Point) => boolean {
  const edges = (solid.edges ?? {}) as Partial<Record<'x' | 'y' | 'z', number>>;
  const radii = [edges.x ?? 0, edges.y ?? 0, edges.z ?? 0];
  const up = radii.indexOf(Math.max(...radii));
  const [a, b] = [(up + 1) % 3, (up + 2) % 3];
  const rim = Math.min(radii[a]!, radii[b]!);
  const corner = radii[up]!;
  const past = (v: number, i: number, radius: number) =>
    Math.abs(v - size[i]! / 2) - size[i]! / 2 + radius;
  const distance = (x: number, y: number) =>
    Math.hypot(Math.max(x, 0), Math.max(y, 0)) + Math.min(Math.max(x, y), 0);
  return (q) => {
    const outline = distance(past(q[a]!, a, corner), past(q[b]!, b, corner)) - corner;
    return distance(outline + rim, past(q[up]!, up, rim)) <= rim;
  };
}

function inPolygon(points: readonly (readonly number[])[], x: number, y: number): boolean {
  let inside = false;
  points.forEach(([x1, y1], i) => {
    const [x2, y2] = points[(i + 1) % points.length] as [number, number];
    if (y1! > y !== y2 > y && x < x1! + ((y - y1!) / (y2 - y1!)) * (x2 - x1!)) inside = !inside;
  });
  return inside;
}

function inRoundedPolygon(profile: readonly (readonly number[])[], x: number, y: number): boolean {
  let inside = inPolygon(profile, x, y);
  profile.forEach(([vx, vy, radius], i) => {
    if (!radius) return;
    const n = profile.length;
    const [before, after] = [profile[(i + n - 1) % n]!, profile[(i + 1) % n]!];
    const u = direction(before[0]! - vx!, before[1]! - vy!);
    const v = direction(after[0]! - vx!, after[1]! - vy!);
    const half = Math.acos(u[0] * v[0] + u[1] * v[1]) / 2;
    const reach = radius / Math.tan(half);
    const middle = direction(u[0] + v[0], u[1] + v[1]);
    const centre = [
      vx! + (middle[0] * radius) / Math.sin(half),
      vy! + (middle[1] * radius) / Math.sin(half),
    ] as const;
    const kite = [
      [vx!, vy!],
      [vx! + reach * u[0], vy! + reach * u[1]],
      centre,
      [vx! + reach * v[0], vy! + reach * v[1]],
    ];
    if (!inPolygon(kite, x, y) || Math.hypot(x - centre[0], y - centre[1]) <= radius) return;
    // between corner and arc: cut off where the corner points out, filled where it points in
    inside = !inPolygon(profile, vx! + 1e-4 * middle[0] * reach, vy! + 1e-4 * middle[1] * reach);
  });
  return inside;
}

function direction(x: number, y: number): readonly [number, number] {
  const size = Math.hypot(x, y);
  return [x / size, y / size];
}
