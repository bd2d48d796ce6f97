import { columns } from './columns';
import { horizontalAxes } from './horizontal-axes';
import { levels, type Mesh } from './mesh';
import type { Vec3 } from './vec3';

/** Where a line meets a mesh. */
export interface Crossing {
  /** Level of the place along the direction, direction·p, in the mesh's unit. */
  level: number;
  /** +1: into the solid along the direction; −1: out of it. */
  into: 1 | -1;
  /** Index of the triangle's first corner in `triangles`. */
  triangle: number;
}

/** All lines of one direction through a mesh. */
export interface MeshLines {
  /** Where the line through `point` meets the mesh, by level. On a closed mesh `into` adds up to 0. */
  crossings(point: Vec3): Crossing[];
}

/** Most cells a side of the grid. */
const mostCells = 512;

/**
 * Looks along one direction (a unit vector) through a closed mesh, its triangles sorted into a grid of cells
 * square to it. Made in O(triangles); a line then costs the triangles of one cell.
 *
 * Watertight: a triangle is met when its outline winds round the line, told by the sides that cross the half-line
 * {b = 0, a > 0} beside it, b ≥ 0 counting as above. A side is cut by the same arithmetic from both of
 * its triangles, so on a closed mesh every cut is counted in and out once, whatever the rounding.
 */
export function meshLines(mesh: Mesh, direction: Vec3): MeshLines {
  const { triangles } = mesh;
  const [e1, e2] = horizontalAxes(direction);
  const a = levels(mesh, e1);
  const b = levels(mesh, e2);
  const z = levels(mesh, direction);
  const cells = gridOf(triangles, a, b);

  return {
    crossings([x, y, zed]) {
      const pa = e1[0] * x + e1[1] * y + e1[2] * zed;
      const pb = e2[0] * x + e2[1] * y + e2[2] * zed;
      const found: Crossing[] = [];
      for (const n of cells(pa, pb)) {
        const crossing = met(n, pa, pb);
        if (crossing) found.push(crossing);
      }
      return found.sort((one, other) => one.level - other.level);
    },
  };

  function met(n: number, pa: number, pb: number): Crossing | null {
    let winding = 0;
    let right = 0;
    let rightZ = 0;
    let left = 0;
    let leftZ = 0;
    for (let c = 0; c < 3; c += 1) {
      const from = triangles[n + c]!;
      const to = triangles[n + (c === 2 ? 0 : c + 1)]!;
      const up = b[to]! >= pb;
      if (b[from]! >= pb === up) continue;
      const high = up ? to : from;
      const low = up ? from : to;
      const t = (b[high]! - pb) / (b[high]! - b[low]!);
      const cut = between(a[high]!, a[low]!, t) - pa;
      const cutZ = between(z[high]!, z[low]!, t);
      if (cut > 0) {
        winding += up ? 1 : -1;
        right = cut;
        rightZ = cutZ;
      } else {
        left = cut;
        leftZ = cutZ;
      }
    }
    if (winding === 0) return null;
    // a triangle that looks against the direction winds clockwise and is where the line goes in
    return {
      level: between(rightZ, leftZ, right / (right - left)),
      into: winding > 0 ? -1 : 1,
      triangle: n,
    };
  }
}

/** one + t·(other − one), kept between the two whatever the rounding. */
function between(one: number, other: number, t: number): number {
  const value = one + t * (other - one);
  return Math.min(Math.max(value, Math.min(one, other)), Math.max(one, other));
}

/** Triangles by the cells that their box touches; coarser where that would be more than four a triangle. */
function gridOf(
  triangles: Uint32Array,
  a: Float64Array,
  b: Float64Array,
): (pa: number, pb: number) => Uint32Array {
  const count = triangles.length / 3;
  const [lowA, highA, lowB, highB] = columns(4, count);
  let [minA, maxA, minB, maxB] = [Infinity, -Infinity, Infinity, -Infinity];
  for (let n = 0; n < count; n += 1) {
    const i = triangles[3 * n]!;
    const j = triangles[3 * n + 1]!;
    const k = triangles[3 * n + 2]!;
    lowA[n] = Math.min(a[i]!, a[j]!, a[k]!);
    highA[n] = Math.max(a[i]!, a[j]!, a[k]!);
    lowB[n] = Math.min(b[i]!, b[j]!, b[k]!);
    highB[n] = Math.max(b[i]!, b[j]!, b[k]!);
    minA = Math.min(minA, lowA[n]!);
    maxA = Math.max(maxA, highA[n]!);
    minB = Math.min(minB, lowB[n]!);
    maxB = Math.max(maxB, highB[n]!);
  }
  let side = Math.min(mostCells, Math.max(1, Math.ceil(Math.sqrt(count / 2))));
  for (; side > 1 && entries(side) > 4 * count + 64; side = side >> 1);

  const starts = new Uint32Array(side * side + 1);
  for (let n = 0; n < count; n += 1) each(n, (cell) => (starts[cell + 1]! += 1));
  for (let cell = 0; cell < side * side; cell += 1) starts[cell + 1]! += starts[cell]!;
  const list = new Uint32Array(starts[side * side]!);
  const filled = starts.slice();
  for (let n = 0; n < count; n += 1) {
    each(n, (cell) => {
      list[filled[cell]!] = 3 * n;
      filled[cell]! += 1;
    });
  }
  const none = new Uint32Array(0);
  return (pa, pb) => {
    if (!(pa >= minA && pa <= maxA && pb >= minB && pb <= maxB)) return none;
    const cell = place(pb, minB, maxB, side) * side + place(pa, minA, maxA, side);
    return list.subarray(starts[cell]!, starts[cell + 1]!);
  };

  function each(n: number, visit: (cell: number) => void): void {
    const toA = place(highA[n]!, minA, maxA, side);
    const toB = place(highB[n]!, minB, maxB, side);
    for (let row = place(lowB[n]!, minB, maxB, side); row <= toB; row += 1) {
      for (let at = place(lowA[n]!, minA, maxA, side); at <= toA; at += 1) visit(row * side + at);
    }
  }

  function entries(cells: number): number {
    let sum = 0;
    for (let n = 0; n < count; n += 1) {
      sum +=
        (place(highA[n]!, minA, maxA, cells) - place(lowA[n]!, minA, maxA, cells) + 1) *
        (place(highB[n]!, minB, maxB, cells) - place(lowB[n]!, minB, maxB, cells) + 1);
    }
    return sum;
  }
}

function place(value: number, min: number, max: number, cells: number): number {
  if (!(max > min)) return 0;
  return Math.min(Math.floor(((value - min) / (max - min)) * cells), cells - 1);
}
