/** What is drawn of an elevation: least and greatest place across and up, mm. */
export interface Frame {
  minX: number;
  maxX: number;
  minY: number;
  maxY: number;
}

/** A stretch of a drawing, mm. */
export interface Stretch {
  x1: number;
  y1: number;
  x2: number;
  y2: number;
}

/** Cells of the frame across and up. */
export const cells = 48;

/** Things of a drawing by the cells of its frame, so that a line is held against the few near it. */
export class FrameGrid<T> {
  private readonly held = new Map<number, T[]>();

  constructor(private readonly frame: Frame) {}

  /** Into every cell that the box of `places` touches, and half a cell beside it. */
  addBox(one: T, places: readonly (readonly number[])[]): void {
    const columns = span(places.map(([x]) => this.across(x!)));
    const rows = span(places.map(([, y]) => this.up(y!)));
    for (let row = rows.first; row <= rows.last; row += 1) {
      for (let column = columns.first; column <= columns.last; column += 1) {
        this.add(row * cells + column, one);
      }
    }
  }

  /** Into the cells along a stretch, and those a third of a cell beside it. */
  addAlong(one: T, stretch: Stretch): void {
    const touched = new Set<number>();
    for (const [x, y] of this.steps(stretch)) {
      for (const dx of [-0.35, 0.35]) {
        for (const dy of [-0.35, 0.35]) touched.add(cellOf(x + dx, y + dy));
      }
    }
    for (const cell of touched) this.add(cell, one);
  }

  /** Everything near a stretch, each once. */
  along(stretch: Stretch): Set<T> {
    const found = new Set<T>();
    let last = -1;
    for (const [x, y] of this.steps(stretch)) {
      const cell = cellOf(x, y);
      if (cell === last) continue;
      last = cell;
      for (const one of this.held.get(cell) ?? []) found.add(one);
    }
    return found;
  }

  private add(cell: number, one: T): void {
    const list = this.held.get(cell);
    if (list) list.push(one);
    else this.held.set(cell, [one]);
  }

  /** Places along a stretch in cells, a quarter of a cell apart. */
  private steps({ x1, y1, x2, y2 }: Stretch): (readonly [number, number])[] {
    const [ax, ay, bx, by] = [this.across(x1), this.up(y1), this.across(x2), this.up(y2)];
    const count = Math.max(1, Math.ceil(4 * Math.max(Math.abs(bx - ax), Math.abs(by - ay))));
    return Array.from({ length: count + 1 }, (_, i) => {
      const t = i / count;
      return [ax + t * (bx - ax), ay + t * (by - ay)] as const;
    });
  }

  private across(x: number): number {
    const { minX, maxX } = this.frame;
    return maxX > minX ? (cells * (x - minX)) / (maxX - minX) : 0;
  }

  private up(y: number): number {
    const { minY, maxY } = this.frame;
    return maxY > minY ? (cells * (y - minY)) / (maxY - minY) : 0;
  }
}

/** Cells from half a cell before the least of some places to the one after the greatest. */
export function span(places: readonly number[]): { first: number; last: number } {
  return {
    first: Math.max(0, Math.floor(Math.min(...places) - 0.5)),
    last: Math.min(cells - 1, Math.ceil(Math.max(...places))),
  };
}

function cellOf(x: number, y: number): number {
  return clamped(y) * cells + clamped(x);
}

function clamped(value: number): number {
  return Math.min(cells - 1, Math.max(0, Math.floor(value)));
}
