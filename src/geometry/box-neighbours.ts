import type { Vec3 } from './vec3';

/** Most cells a side of the grid, and most cells in all that the boxes may touch, for each box. */
const mostCells = 128;
const mostTouched = 12;

/**
 * Boxes near each other: `of(i)` gives the boxes after number i that may meet it, some of them more than once. Boxes
 * are sorted into a grid of cells, coarser where each would touch many. O(boxes) to make.
 */
export function boxNeighbours(low: readonly Vec3[], high: readonly Vec3[]) {
  const count = low.length;
  const axes = [0, 1, 2].map((axis) => {
    let from = Infinity;
    let to = -Infinity;
    for (let i = 0; i < count; i += 1) {
      from = Math.min(from, low[i]![axis]!);
      to = Math.max(to, high[i]![axis]!);
    }
    return { from, length: to - from };
  });
  const longest = Math.max(...axes.map(({ length }) => length));
  let side = Math.max(1, Math.min(mostCells, Math.round(Math.sqrt(count / 6))));
  while (side > 1 && touched(side) > mostTouched * count) side = side >> 1;

  const cells = cellsAt(side);
  const starts = new Uint32Array(cells.count + 1);
  for (let i = 0; i < count; i += 1) each(i, (cell) => (starts[cell + 1]! += 1));
  for (let cell = 0; cell < cells.count; cell += 1) starts[cell + 1]! += starts[cell]!;
  const list = new Uint32Array(starts[cells.count]!);
  const filled = starts.slice();
  for (let i = 0; i < count; i += 1) {
    each(i, (cell) => {
      list[filled[cell]!] = i;
      filled[cell]! += 1;
    });
  }
  return {
    of(i: number, visit: (other: number) => void): void {
      each(i, (cell) => {
        for (let at = starts[cell + 1]! - 1; at >= starts[cell]! && list[at]! > i; at -= 1) {
          visit(list[at]!);
        }
      });
    },
  };

  function cellsAt(cellsASide: number) {
    const size = longest / cellsASide;
    const [nx, ny, nz] = axes.map(({ length }) =>
      longest > 0 ? Math.max(1, Math.ceil(length / size)) : 1,
    ) as [number, number, number];
    const place = (value: number, axis: number, most: number) =>
      longest > 0
        ? Math.min(Math.max(Math.floor((value - axes[axis]!.from) / size), 0), most - 1)
        : 0;
    return { count: nx * ny * nz, n: [nx, ny, nz] as const, place };
  }

  function span(i: number, { n, place }: ReturnType<typeof cellsAt>) {
    return [0, 1, 2].map(
      (axis) =>
        [place(low[i]![axis]!, axis, n[axis]!), place(high[i]![axis]!, axis, n[axis]!)] as const,
    ) as unknown as readonly [
      readonly [number, number],
      readonly [number, number],
      readonly [number, number],
    ];
  }

  function touched(cellsASide: number): number {
    const grid = cellsAt(cellsASide);
    let sum = 0;
    for (let i = 0; i < count; i += 1) {
      const [x, y, z] = span(i, grid);
      sum += (x[1] - x[0] + 1) * (y[1] - y[0] + 1) * (z[1] - z[0] + 1);
    }
    return sum;
  }

  function each(i: number, visit: (cell: number) => void): void {
    const [x, y, z] = span(i, cells);
    const [nx, ny] = cells.n;
    for (let c = z[0]; c <= z[1]; c += 1) {
      for (let b = y[0]; b <= y[1]; b += 1) {
        for (let a = x[0]; a <= x[1]; a += 1) visit((c * ny + b) * nx + a);
      }
    }
  }
}
