import {
  answerAt,
  densityOf,
  safeFillL,
  safeFillMm,
  unusableL,
  type Answer,
  type DipTable,
} from '../table/answer-at';
import { curveFromRows, depthAt } from '../table/curve';
import type { ChartInput } from './chart-input';
import type { Region } from './chart-report';

/** The table of the revision as a function, and the levels that divide it. Readings mm, volumes L. */
export interface ChartLevels {
  at(depthMm: number): Answer;
  /** Reading of a volume; null where the stick does not reach it. */
  readingOf(litres: number): number | null;
  regionAt(depthMm: number): Region;
  heightMm: number;
  capacityL: number;
  densityKgPerM3: number;
  outletMm: number | null;
  unusableL: number;
  safeFillL: number;
  safeFillMm: number | null;
  largestPlusMinusL: number;
}

/** The levels of one frozen revision, from its issued rows. A reading outside its range throws `invalid`. */
export function chartLevels(input: ChartInput): ChartLevels {
  const { settings, capacityL, heightMm } = input;
  const table: DipTable = {
    curve: curveFromRows(input.rows, input.levelPerReading),
    plusMinusL: input.rows.map(({ plusMinusL }) => plusMinusL),
    heightMm,
    capacityL,
    settings,
  };
  const volumes = table.curve.volumeL;
  const outletMm = settings.outletMm === null ? null : Math.min(settings.outletMm, heightMm);
  const safeMm = safeFillMm(table);
  return {
    at: (depthMm) => answerAt(table, depthMm),
    readingOf: (litres) =>
      litres >= volumes[0]! && litres <= volumes.at(-1)! ? depthAt(table.curve, litres) : null,
    regionAt: (depthMm) =>
      outletMm !== null && depthMm <= outletMm + 1e-6
        ? 'unusable'
        : safeMm !== null && depthMm > safeMm + 1e-6
          ? 'headroom'
          : 'usable',
    heightMm,
    capacityL,
    densityKgPerM3: densityOf(settings),
    outletMm,
    unusableL: unusableL(table),
    safeFillL: safeFillL(table),
    safeFillMm: safeMm,
    largestPlusMinusL: Math.max(...(table.plusMinusL as number[])),
  };
}
