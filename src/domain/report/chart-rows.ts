import { densityOf } from '../table/answer-at';
import { liquids } from '../liquid/liquids';
import { formatLength } from '../units/format-length';
import { mmPerInch, type LengthUnit } from '../units/length-unit';
import { volumeUnitSigns } from '../units/volume-unit';
import type { TableDigits } from '../units/table-digits';
import type { ChartInput } from './chart-input';
import type { ChartLevels } from './chart-levels';
import type { ChartColumn, ChartRow } from './chart-report';
import { chartReadings, usualStepMm } from './chart-step';

const waste: readonly ChartColumn['key'][] = [
  'depth',
  'room',
  'volume',
  'plusMinus',
  'usable',
  'mass',
];
const supply: readonly ChartColumn['key'][] = [
  'depth',
  'volume',
  'plusMinus',
  'usable',
  'room',
  'mass',
];

/**
 * Columns: where full is the emergency, the room left stands first. Without a density there are no
 * kilograms.
 */
export function chartColumns({ settings, options }: ChartInput): ChartColumn[] {
  const heads: Record<ChartColumn['key'], string> = {
    depth: options.length,
    volume: options.volume === 'l' ? 'litres' : volumeUnitSigns[options.volume],
    plusMinus: '±',
    usable: 'usable',
    room: 'room',
    mass: 'kg',
  };
  const keys = liquids[settings.liquid].watch === 'high' ? waste : supply;
  const weighed = Number.isFinite(densityOf(settings));
  return keys.filter((key) => key !== 'mass' || weighed).map((key) => ({ key, head: heads[key] }));
}

/**
 * Rows at an even step of the stick, read from the issued rows, and one at the highest reading:
 * "brim", or "top" where the stick ends below the brim of a tilted tank.
 */
export function chartRows(
  input: ChartInput,
  levels: ChartLevels,
  digits: TableDigits,
  columns: readonly ChartColumn[],
): ChartRow[] {
  const { options, heightMm } = input;
  const stepMm = stepOf(input);
  const readings = chartReadings(heightMm, stepMm);
  if (digits.volume(levels.at(0).volumeL) !== digits.volume(0)) readings.unshift(0);
  const every = rowGroup(input);
  return readings.map((depthMm) => {
    const onStick = isMultiple(depthMm, stepMm);
    const answer = levels.at(depthMm);
    const over = levels.regionAt(depthMm) === 'headroom';
    const cells: Record<ChartColumn['key'], string> = {
      depth: onStick
        ? formatLength(depthMm, options.length, decimalsOf(stepMm, options.length))
        : topWord(levels),
      volume: digits.volume(answer.volumeL),
      plusMinus: digits.plusMinus(answer.plusMinusL),
      usable: digits.volume(answer.usableL),
      room: over ? 'over' : digits.volume(answer.roomL),
      mass: Number.isFinite(answer.massKg) ? digits.mass(answer.massKg) : '',
    };
    return {
      depthMm,
      cells: columns.map(({ key }) => cells[key]),
      strong: !onStick || (depthMm > 0 && isMultiple(depthMm, stepMm * every)),
      region: levels.regionAt(depthMm),
    };
  });
}

/** The highest reading: the brim, or only the top of the stick. */
export function topWord({ at, heightMm, capacityL }: ChartLevels): string {
  return capacityL - at(heightMm).volumeL > 1e-6 * capacityL ? 'top' : 'brim';
}

/** Decimals of a reading in a table with this step; inches are eighths. */
export function decimalsOf(stepMm: number, unit: LengthUnit): number {
  return unit === 'cm' && !isMultiple(stepMm, 10) ? 1 : 0;
}

/** Rows from one strong row to the next: five, or a whole inch or more. */
export function rowGroup(input: ChartInput): number {
  if (input.options.length !== 'in') return 5;
  const perInch = Math.round(mmPerInch / stepOf(input));
  return perInch > 2 ? perInch : 4;
}

function stepOf({ options, heightMm }: ChartInput): number {
  return options.stepMm ?? usualStepMm(heightMm, options.length);
}

function isMultiple(value: number, step: number): boolean {
  return Math.abs(value / step - Math.round(value / step)) < 1e-6;
}
