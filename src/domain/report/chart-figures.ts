import { liquids } from '../liquid/liquids';
import { volumeUnitSigns } from '../units/volume-unit';
import type { TableDigits } from '../units/table-digits';
import type { ChartInput } from './chart-input';
import type { ChartLevels } from './chart-levels';
import type { ChartFigure } from './chart-report';
import { markReading } from './mark-reading';

/** The box at the head: brim, safe fill, unusable, usable, each under its own name and with its ±. */
export function chartFigures(
  { settings, options, heightMm, brimPlusMinusL }: ChartInput,
  levels: ChartLevels,
  digits: TableDigits,
): ChartFigure[] {
  const figure = (
    label: string,
    litres: number,
    plusMinusL: number,
    detail: string,
  ): ChartFigure => ({
    label,
    figure: digits.volume(litres),
    plusMinus: digits.plusMinus(plusMinusL),
    unit: volumeUnitSigns[options.volume],
    detail,
  });
  const atBrim = brimPlusMinusL ?? levels.at(heightMm).plusMinusL;
  const atSafeFill = levels.safeFillMm === null ? atBrim : levels.at(levels.safeFillMm).plusMinusL;
  const atOutlet = levels.outletMm === null ? 0 : levels.at(levels.outletMm).plusMinusL;
  const brim = figure('Brim, computed', levels.capacityL, atBrim, weightWhenFull(levels, digits));
  const safe = figure(
    `Safe fill, ${settings.safeFillPercent} % of brim`,
    levels.safeFillL,
    atSafeFill,
    levels.safeFillMm === null
      ? 'above the reach of the stick'
      : `stop at ${markReading(levels.safeFillMm, options.length, 'down')}`,
  );
  const unusable =
    levels.outletMm === null
      ? {
          ...figure('Unusable', 0, 0, 'no outlet height given'),
          figure: 'not known',
          plusMinus: null,
          unit: '',
        }
      : figure(
          'Unusable',
          levels.unusableL,
          atOutlet,
          `below the outlet at ${markReading(levels.outletMm, options.length, 'up')}`,
        );
  const usable = figure(
    'Usable',
    Math.max(0, levels.safeFillL - levels.unusableL),
    Math.hypot(atSafeFill, atOutlet),
    levels.outletMm === null ? 'up to safe fill' : 'from outlet to safe fill',
  );
  return liquids[settings.liquid].watch === 'high'
    ? [safe, brim, unusable, usable]
    : [brim, safe, unusable, usable];
}

function weightWhenFull({ densityKgPerM3, capacityL }: ChartLevels, digits: TableDigits): string {
  const kg = (densityKgPerM3 * capacityL) / 1000;
  return Number.isFinite(kg) ? `${digits.mass(kg)} kg when full` : 'weight not known';
}
