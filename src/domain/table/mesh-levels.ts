import { levels } from '../../geometry/mesh';
import { dot } from '../../geometry/vec3';
import { levelOfReading } from './level';
import type { LiquidSpace } from './liquid-space';
import type { ReadingFrame } from './preview';

/** Readings as levels of the mesh, in its own frame, mm. */
export interface MeshLevels {
  /** Level of each reading, in the order given, never beyond the mesh. */
  ofReadings: readonly number[];
  /** The same ascending, each once, and always the highest: a sweep sees its last level from below. */
  ascending: Float64Array;
  /** Where the level of each reading stands among them. */
  rows: readonly number[];
  low: number;
  high: number;
}

/**
 * Levels of the mesh for readings along the stick (mm, any order, also twice). Empty and brim come from closed
 * form: there the mesh is asked at its own ends, which facets may put a hair elsewhere.
 */
export function meshLevels(
  { mesh, origin }: LiquidSpace,
  frame: ReadingFrame,
  readingsMm: readonly number[],
): MeshLevels {
  const { up, lowestLevelMm, highestLevelMm } = frame;
  const shift = dot(up, origin);
  const [low, high] = span(levels(mesh, up));
  const rounding = 1e-12 * (highestLevelMm - lowestLevelMm);
  const ofReadings = readingsMm.map((readingMm) => {
    const level = levelOfReading(frame, readingMm);
    if (level <= lowestLevelMm + rounding) return low;
    if (level >= highestLevelMm - rounding) return high;
    return Math.min(Math.max(level - shift, low), high);
  });
  const ascending = Float64Array.from(new Set([...ofReadings, high])).sort();
  const rowOf = new Map(Array.from(ascending, (level, row) => [level, row]));
  return { ofReadings, ascending, rows: ofReadings.map((level) => rowOf.get(level)!), low, high };
}

function span(values: Float64Array): readonly [number, number] {
  let low = Infinity;
  let high = -Infinity;
  for (const value of values) {
    if (value < low) low = value;
    if (value > high) high = value;
  }
  return [low, high];
}
