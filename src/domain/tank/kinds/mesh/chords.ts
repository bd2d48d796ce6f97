import { unionOf, without, type Interval } from '../../../../geometry/intervals';
import { horizontalAxes } from '../../../../geometry/horizontal-axes';
import type { Line } from '../../../../geometry/line';
import { dot, type Vec3 } from '../../../../geometry/vec3';
import type { LoadedMesh } from './loaded-meshes';

/** Where the line is looked at again beside itself, along two directions across it. */
const beside = [
  [1, 1],
  [1, -1],
  [-1, 1],
  [-1, -1],
  [1, 0],
  [-1, 0],
  [0, 1],
  [0, -1],
] as const;

/**
 * Stretches of a line of the own frame inside a mesh, its factors mm to a unit of the file. `slack` looks across the
 * line: where the mesh is another `slack` mm beside it, it runs along a wall; then what any of the lines beside it
 * meets counts too (slack > 0), or only what all of them meet (slack < 0).
 */
export function chordsInMesh(
  loaded: LoadedMesh,
  factors: Vec3,
  line: Line,
  slack: number,
): Interval[] {
  const own = chordsAlong(loaded, factors, line);
  if (slack === 0) return own;
  const [e1, e2] = horizontalAxes(line.direction);
  const by = Math.abs(slack);
  const others = beside.map(([a, b]) => {
    const origin = line.origin.map(
      (value, axis) => value + by * (a * e1[axis]! + b * e2[axis]!),
    ) as unknown as Vec3;
    return chordsAlong(loaded, factors, { origin, direction: line.direction });
  });
  if (others.every((one) => alike(one, own, 100 * by))) return own;
  return slack > 0
    ? unionOf([own, ...others].flat())
    : others.reduce((left, one) => without(left, without(left, one)), own);
}

function chordsAlong(loaded: LoadedMesh, factors: Vec3, { origin, direction }: Line): Interval[] {
  const inFile = (v: Vec3): Vec3 => [v[0] / factors[0], v[1] / factors[1], v[2] / factors[2]];
  const along = inFile(direction);
  const size = Math.hypot(...along);
  const unitAlong: Vec3 = [along[0] / size, along[1] / size, along[2] / size];
  const from = inFile(origin);
  const { middle } = loaded;
  const point: Vec3 = [from[0] + middle[0], from[1] + middle[1], from[2] + middle[2]];
  const start = dot(unitAlong, point);
  const intervals: Interval[] = [];
  let winding = 0;
  for (const { level, into } of loaded.linesAlong(unitAlong).crossings(point)) {
    const t = (level - start) / size;
    if (winding === 0 && into === 1) intervals.push({ from: t, to: t });
    winding += into;
    if (winding === 0 && into === -1) intervals.at(-1)!.to = t;
  }
  return intervals;
}

function alike(one: readonly Interval[], other: readonly Interval[], within: number): boolean {
  return (
    one.length === other.length &&
    one.every(
      ({ from, to }, i) =>
        Math.abs(from - other[i]!.from) <= within && Math.abs(to - other[i]!.to) <= within,
    )
  );
}
