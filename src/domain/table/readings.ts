import { DipwrightError, invalid } from '../errors';
import { samePlaceMm, snap } from '../../geometry/tolerance';
import { mostRows, type Readings } from './request';

/**
 * The readings a table stands at, mm: with a step, 0, step, 2·step … and heightMm; or exactly those asked
 * for. Throws `invalid` for too many rows and for a reading outside 0…heightMm.
 */
export function readingsOf(readings: Readings, heightMm: number): number[] {
  return 'stepMm' in readings ? stepped(readings.stepMm, heightMm) : asked(readings.atMm, heightMm);
}

function stepped(stepMm: number, heightMm: number): number[] {
  const whole = Math.ceil((heightMm - samePlaceMm) / stepMm);
  if (whole + 1 > mostRows) {
    const least = Math.ceil(heightMm / (mostRows - 1) / 0.01) * 0.01;
    throw invalid(
      '/stepMm',
      `A step of ${stepMm} mm would give more than ${mostRows} rows: take ${round(least)} mm or more.`,
    );
  }
  const result = Array.from({ length: Math.max(whole, 1) }, (_, i) => snap(i * stepMm));
  return [...result, heightMm];
}

function asked(atMm: readonly number[], heightMm: number): number[] {
  const faults = atMm.flatMap((readingMm, index) =>
    readingMm >= 0 && readingMm <= heightMm + samePlaceMm
      ? []
      : [
          {
            pointer: `/atMm/${index}`,
            detail: `A reading of ${readingMm} mm lies outside 0 to ${round(heightMm)} mm, the range of this tank.`,
          },
        ],
  );
  if (faults.length > 0) throw new DipwrightError('invalid', faults[0]!.detail, { faults });
  return [...atMm];
}

function round(mm: number): number {
  return Math.round(mm * 1000) / 1000;
}
