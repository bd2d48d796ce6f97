import type { TableRow } from './request';

/** A row with all that is known of its level. More than what `strap` and /api/v1/compute print. */
export interface LevelRow extends TableRow {
  /**
   * Walls, floor and ceilings that the liquid touches, without its free surface, cm². Just above the level, like
   * the surface: a flat floor counts from the first drop. At the brim just below it: without the lid.
   */
  wettedCm2: number;
  /** Litres that a millimetre more of reading means: free surface times dLevel/dReading. */
  slopeLPerMm: number;
}
