import { joiningPools } from '../../geometry/pools';
import { samePlaceMm } from '../../geometry/tolerance';
import { dot } from '../../geometry/vec3';
import { chordsOf, type PlacedSolid } from '../tank/placed-solid';
import { columnAt } from './column';
import { readingOfLevel } from './level';
import type { LiquidSpace } from './liquid-space';
import type { ReadingFrame } from './preview';
import type { StickNotice } from './stick-notice';

/** Part of the capacity below which a puddle beside the stick is not worth a word. */
const worthSaying = 1e-4;

/** Notices of a stick, or of plumb depth when there is none; none when every reading tells all. */
export function stickNotices(
  solids: readonly PlacedSolid[],
  space: LiquidSpace,
  frame: ReadingFrame,
): StickNotice[] {
  return [...poolNotice(space, frame), ...crossing(solids, frame)];
}

function poolNotice({ mesh, origin, volumeMm3 }: LiquidSpace, frame: ReadingFrame): StickNotice[] {
  const joins = joiningPools(mesh, frame.up)
    .map(({ levelMm, pools }) => ({
      readingMm: readingOfLevel(frame, levelMm + dot(frame.up, origin)),
      pools: pools.filter((pool) => pool.volumeMm3 > worthSaying * volumeMm3).length,
    }))
    .filter(({ readingMm, pools }) => pools > 1 && readingMm > samePlaceMm);
  if (joins.length === 0) return [];
  const highest = joins.reduce((one, other) => (other.readingMm > one.readingMm ? other : one));
  // every join makes so many pools one
  const pools = 1 + joins.reduce((sum, join) => sum + join.pools - 1, 0);
  return [{ what: 'pools', readingMm: Math.min(highest.readingMm, frame.heightMm), pools }];
}

function crossing(
  solids: readonly PlacedSolid[],
  { stick, heightMm }: ReadingFrame,
): StickNotice[] {
  if (!stick) return [];
  const above = columnAt(solids, ...stick.at).filter(({ from }) => from > stick.roofZ);
  if (above.length === 0) return [];
  const line = { origin: [...stick.at, 0] as const, direction: [0, 0, 1] as const };
  const crossed = solids.find(
    (one) =>
      one.solid.role === 'displaces' &&
      chordsOf(one, line, samePlaceMm).some(
        ({ from, to }) => from - stick.roofZ < 1e-4 && to > stick.roofZ,
      ),
  );
  return [{ what: 'crossed', readingMm: heightMm, by: crossed?.solid.id ?? null }];
}
