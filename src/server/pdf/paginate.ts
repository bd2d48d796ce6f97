/** How many rows stand in each block of each page, from the first page on. */
export type Pages = readonly (readonly number[])[];

export interface Room {
  /** Points that rows may fill on the page. */
  height: number;
  /** Most blocks side by side. */
  blocks: number;
}

export const leastRowHeight = 12.2;
/** Rows of a last page may grow to this before a block more is used. */
const easyRowHeight = 18;
const mostRowHeight = 25;

/**
 * Spreads rows over blocks and pages: on one page where the least row height allows it, otherwise
 * full pages and a last one as even as can be. Blocks end where a group ends, so that every block
 * begins afresh below a strong row.
 *
 * @param group rows from one strong row to the next
 */
export function paginate(rows: number, group: number, first: Room, further: Room): Pages {
  if (rows <= first.blocks * fitting(first.height, leastRowHeight)) {
    return [evenly(rows, group, first.blocks, first)];
  }
  const pages: number[][] = [full(first, group)];
  let left = rows - sum(pages[0]!);
  while (left > further.blocks * fitting(further.height, leastRowHeight)) {
    const page = full(further, group);
    pages.push(page);
    left -= sum(page);
  }
  const few = Math.ceil(left / 2) <= fitting(further.height, easyRowHeight);
  pages.push(evenly(left, group, few ? 2 : further.blocks, further));
  return pages;
}

/** The row height of a page: rows fill the room as far as they stay one table. */
export function rowHeight(blocks: readonly number[], { height }: Room): number {
  const longest = Math.max(1, ...blocks);
  return Math.min(mostRowHeight, height / longest);
}

function fitting(height: number, each: number): number {
  return Math.max(1, Math.floor(height / each + 1e-6));
}

function full({ height, blocks }: Room, group: number): number[] {
  const most = fitting(height, leastRowHeight);
  const count = most > group ? most - (most % group) : most;
  return Array.from({ length: blocks }, () => count);
}

function evenly(rows: number, group: number, blocks: number, { height }: Room): number[] {
  const least = Math.ceil(rows / blocks);
  const whole = Math.ceil(least / group) * group;
  const longest = whole <= fitting(height, leastRowHeight) ? whole : least;
  return Array.from({ length: blocks }, (_, block) =>
    Math.max(0, Math.min(longest, rows - block * longest)),
  ).filter((count) => count > 0);
}

function sum(counts: readonly number[]): number {
  return counts.reduce((all, count) => all + count, 0);
}
