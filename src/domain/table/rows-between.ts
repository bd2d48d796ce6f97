import { levels } from '../../geometry/mesh';
import { snap } from '../../geometry/tolerance';
import { dot } from '../../geometry/vec3';
import { litresBetween } from './curve';
import { readingOfLevel } from './level';
import type { LiquidSpace } from './liquid-space';
import type { ReadingFrame } from './preview';
import type { TableRow } from './request';
import { tableRows } from './table-rows';

/** Part of the capacity that the curve may miss by at the places looked at; a third of what is promised. */
const mostMiss = 3e-7;

/** Where a segment is looked at, as parts of it: closer to its ends, where a tangent floor or roof bends most. */
const places = [1 / 64, 1 / 16, 3 / 16, 1 / 2, 13 / 16, 15 / 16, 63 / 64];

/** Corner levels that are looked at in one segment; a round wall has hundreds and needs none. */
const mostCorners = 6;

/** Rounds of looking and splitting, and the most rows that they may add. */
const mostRounds = 16;
const mostAdded = 2_000;

type Point = Pick<TableRow, 'depthMm' | 'volumeL' | 'surfaceCm2'>;

/**
 * Closer rows for where the cubic between two rows of a table would be wrong: with them the curve is within
 * 1e-6 of capacity everywhere. Over a tangent floor the surface grows as the root of the depth; at a flat
 * step of the floor it jumps; at the foot of a slope it has a bend. The curve is compared with the exact sweep
 * at places inside every segment, all in one sweep, and a segment that misses is split where both halves miss
 * least: at a corner's own level (so a step gets its row exactly) or at one of those places. Repeated until
 * nothing misses by 3e-7. `rows` ascend by reading, mm; the new rows do too, and none of them equals a row.
 */
export function rowsBetween(
  space: LiquidSpace,
  frame: ReadingFrame,
  rows: readonly TableRow[],
): TableRow[] {
  const capacityL = space.volumeMm3 / 1e6;
  const most = mostMiss * capacityL;
  const { corners, steps } = cornerReadings(space, frame);
  const gap = 1e-7 * frame.heightMm;
  const slopeFactor = 1e-4 * frame.levelPerReading;
  const added: TableRow[] = [];

  let open: [Point, Point][] = rows.slice(1).map((row, i) => [rows[i]!, row]);
  for (let round = 0; round < mostRounds && open.length > 0; round += 1) {
    const lookedAt = open.map(([low, high]) => readingsInside(low.depthMm, high.depthMm));
    const found = tableRows(space, frame, lookedAt.flat());
    const next: [Point, Point][] = [];
    let from = 0;
    open.forEach(([low, high], i) => {
      const inside = found.slice(from, (from += lookedAt[i]!.length));
      if (worst(low, high, inside) <= most || added.length >= mostAdded) return;
      const middle = bestSplit(low, high, inside);
      added.push(middle);
      next.push([low, middle], [middle, high]);
    });
    open = next;
  }
  return added.sort((one, other) => one.depthMm - other.depthMm);

  function readingsInside(low: number, high: number): number[] {
    if (high - low <= 2 * gap) return [];
    const inside = (readings: readonly number[]) =>
      readings.slice(firstAbove(readings, low + gap), firstAbove(readings, high - gap));
    const met = inside(corners);
    const own = met.length <= mostCorners ? met : inside(steps).slice(0, mostCorners);
    const even = places.map((part) => low + part * (high - low));
    return [...own, ...even].sort((one, other) => one - other);
  }

  function worst(low: Point, high: Point, inside: readonly Point[]): number {
    return Math.max(0, ...inside.map((point) => missOf(low, high, point)));
  }

  function missOf(low: Point, high: Point, { depthMm, volumeL }: Point): number {
    const curve = litresBetween(
      low.depthMm,
      low.volumeL,
      low.surfaceCm2 * slopeFactor,
      high.depthMm,
      high.volumeL,
      high.surfaceCm2 * slopeFactor,
      depthMm,
    );
    return Math.abs(curve - volumeL);
  }

  function bestSplit(low: Point, high: Point, inside: readonly TableRow[]): TableRow {
    let best = inside[0]!;
    let least = Infinity;
    inside.forEach((middle, i) => {
      const miss = Math.max(
        worst(low, middle, inside.slice(0, i)),
        worst(middle, high, inside.slice(i + 1)),
      );
      if (miss < least) [best, least] = [middle, miss];
    });
    return best;
  }
}

/**
 * The readings at which the surface meets corners of the space, and those at which it meets a level face, each
 * ascending, those within 1e-9 of each other as one; mm.
 */
function cornerReadings({ mesh, origin }: LiquidSpace, frame: ReadingFrame) {
  const { lowestLevelMm, highestLevelMm, heightMm } = frame;
  const shift = dot(frame.up, origin);
  const z = levels(mesh, frame.up);
  const level = 1e-9 * (highestLevelMm - lowestLevelMm);
  const flat: number[] = [];
  for (let n = 0; n < mesh.triangles.length; n += 3) {
    const [a, b, c] = [0, 1, 2].map((corner) => z[mesh.triangles[n + corner]!]!);
    if (Math.max(a!, b!, c!) - Math.min(a!, b!, c!) <= level) flat.push(a!);
  }
  const readings = (ofMesh: readonly number[]) => {
    const all = [...ofMesh.map((one) => one + shift), lowestLevelMm, highestLevelMm]
      .map((one) => tidy(readingOfLevel(frame, one)))
      .sort((one, other) => one - other);
    return all.filter((reading, i) => i === 0 || reading - all[i - 1]! > 1e-9 * heightMm);
  };
  return { corners: readings(Array.from(z)), steps: readings(flat) };
}

/** Rounding of a reading that lies on the snapping grid is taken off, so that a step at 210 mm reads 210. */
function tidy(mm: number): number {
  const near = snap(mm);
  return Math.abs(near - mm) < 1e-9 ? near : mm;
}

/** Index of the first value above a limit, in ascending values. */
function firstAbove(ascending: readonly number[], limit: number): number {
  let low = 0;
  let high = ascending.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (ascending[middle]! > limit) high = middle;
    else low = middle + 1;
  }
  return low;
}
