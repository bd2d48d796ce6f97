import { mmPerInch, type LengthUnit } from '../units/length-unit';

/** Most rows that one page holds with ease, and most that a chart runs to when nobody chose a step. */
const rowsOfOnePage = 62;
const rowsOfTwoPages = 170;

const ladders: Record<LengthUnit, { fine: readonly number[]; coarse: readonly number[] }> = {
  mm: { fine: [5, 10], coarse: [10, 20, 25, 50, 100, 200, 500, 1000] },
  cm: { fine: [5, 10], coarse: [10, 20, 50, 100, 200, 500, 1000] },
  in: {
    fine: [1 / 8, 1 / 4].map((inches) => inches * mmPerInch),
    coarse: [1 / 4, 1 / 2, 1, 2, 4, 6, 12, 24].map((inches) => inches * mmPerInch),
  },
};

/**
 * Step of the rows when none was chosen, mm: 5 or 10 mm (1/8 or 1/4 in) where the chart then stays
 * on one page, otherwise the smallest that keeps it to two.
 */
export function usualStepMm(heightMm: number, unit: LengthUnit): number {
  const { fine, coarse } = ladders[unit];
  return (
    fine.find((step) => heightMm / step <= rowsOfOnePage) ??
    coarse.find((step) => heightMm / step <= rowsOfTwoPages) ??
    coarse.at(-1)!
  );
}

/**
 * The readings that rows stand at: every multiple of the step from one step up, and the highest
 * reading, on the grid or not. 0 is left out: the caller adds it when liquid stands there.
 */
export function chartReadings(heightMm: number, stepMm: number): number[] {
  const count = Math.floor(heightMm / stepMm + 1e-9);
  const readings = Array.from({ length: count }, (_, index) => (index + 1) * stepMm);
  const last = readings.at(-1) ?? 0;
  if (Math.abs(heightMm - last) < 1e-6) readings[readings.length - 1] = heightMm;
  else readings.push(heightMm);
  return readings;
}
