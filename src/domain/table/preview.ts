import type { SolidFields, Vec3 } from '../tank/solid';
import type { LevelRow } from './level-row';
import type { StickNotice } from './stick-notice';

/** A closed triangle mesh in the tank's frame, mm. Triangles index `positions` in threes, outward. */
export interface TankMesh {
  positions: Float64Array;
  triangles: Uint32Array;
}

/**
 * How a reading along the stick becomes a plumb level and back. "Level" is u·p, mm, with u the
 * unit up vector in the tank's frame: constant over a liquid surface.
 * level = zeroLevelMm + readingMm × levelPerReading.
 */
export interface ReadingFrame {
  up: Vec3;
  zeroLevelMm: number;
  /** u·z with a stick (1 when level), 1 without one. */
  levelPerReading: number;
  /** Highest reading, mm. */
  heightMm: number;
  /** Where the stick stands, its zero and the roof above it, in the tank's frame; null without one. */
  stick: { at: readonly [number, number]; zeroZ: number; roofZ: number } | null;
  /** Levels of the lowest and highest point of the liquid space. */
  lowestLevelMm: number;
  highestLevelMm: number;
}

/** Liquid that the outlet cannot drain, or air that the vent cannot let out, in one place. */
export interface Standing {
  what: 'undrainable' | 'trapped';
  litres: number;
  /** Level u·p of its surface, mm: liquid stands below it, air above it. */
  levelMm: number;
  /** Its deepest place (of air: its highest) in the tank's frame, mm. */
  at: Vec3;
}

/** All that the bench and the front page draw and read from, computed at once in a worker. */
export interface Preview {
  space: TankMesh;
  /** Each solid alone, placed and turned, for balloons, picking and hatching; document order. */
  solids: readonly (TankMesh & Pick<SolidFields, 'id' | 'role'>)[];
  /** Least and greatest x, y, z of the liquid space in the tank's frame, mm: its overall sizes. */
  extent: { low: Vec3; high: Vec3 };
  frame: ReadingFrame;
  capacityL: number;
  errorL: number;
  undrainableL: number;
  trappedL: number;
  standing: readonly Standing[];
  /** Separate pieces of liquid space; more than 1 cannot be issued. */
  pieces: number;
  /** Evenly spaced over 0…heightMm, fine enough for the eye and the Hermite curve between (about 200). */
  rows: readonly LevelRow[];
  /** What the stick cannot tell of this tank as it stands. */
  stickNotices: readonly StickNotice[];
  /** Plain sentences worth reading: "The liquid space is in 2 pieces." */
  notices: readonly string[];
}
