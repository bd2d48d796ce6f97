import type { ReadingFrame } from './preview';

/** Plumb level u·p of the liquid surface at a reading along the stick. mm → mm; exact. */
export function levelOfReading(frame: ReadingFrame, readingMm: number): number {
  return frame.zeroLevelMm + readingMm * frame.levelPerReading;
}

/** Reading along the stick at which the surface stands at a level u·p. mm → mm; exact, not clamped. */
export function readingOfLevel(frame: ReadingFrame, levelMm: number): number {
  return (levelMm - frame.zeroLevelMm) / frame.levelPerReading;
}

/** A reading brought inside what the stick can show, 0…heightMm. */
export function clampReading(frame: ReadingFrame, readingMm: number): number {
  return Math.min(Math.max(readingMm, 0), frame.heightMm);
}
