import { formatLength } from '../units/format-length';
import { mmPerLengthUnit } from '../units/length-unit';
import { marksFor, multiples } from '../units/marks';
import { volumeUnitSigns } from '../units/volume-unit';
import type { TableDigits } from '../units/table-digits';
import type { ChartInput } from './chart-input';
import type { ChartLevels } from './chart-levels';
import type { ChartStick, ChartTick } from './chart-report';
import { markReading } from './mark-reading';

const mostNumbered = 14;
const mostFine = 130;

/** The stick of the print: its marks, its regions and the readings worth a word. */
export function chartStick(
  { options, heightMm }: ChartInput,
  levels: ChartLevels,
  digits: TableDigits,
): ChartStick {
  return {
    heightMm,
    unit: options.length,
    ticks: ticks(heightMm, options.length),
    regions: regions(levels),
    marks: marks(levels, digits, options),
  };
}

function ticks(heightMm: number, unit: ChartInput['options']['length']): ChartTick[] {
  const size = mmPerLengthUnit[unit];
  const span = heightMm / size;
  const { numbered, fine } = marksFor(span, mostNumbered, mostFine, unit === 'in');
  const isAt = (value: number, step: number): boolean =>
    Math.abs(value / step - Math.round(value / step)) < 1e-6;
  return multiples(fine, span).map((value) => {
    const strong = isAt(value, numbered);
    return {
      depthMm: value * size,
      label: strong ? formatLength(value * size, unit) : null,
      weight: strong ? 'numbered' : isAt(value, numbered / 2) ? 'middle' : 'fine',
    };
  });
}

function regions(levels: ChartLevels): ChartStick['regions'] {
  const low = levels.outletMm ?? 0;
  const high = Math.max(low, levels.safeFillMm ?? levels.heightMm);
  return [
    { region: 'unusable' as const, fromMm: 0, toMm: low },
    { region: 'usable' as const, fromMm: low, toMm: high },
    { region: 'headroom' as const, fromMm: high, toMm: levels.heightMm },
  ].filter(({ fromMm, toMm }) => toMm - fromMm > 1e-6);
}

function marks(
  levels: ChartLevels,
  digits: TableDigits,
  { volume, length }: ChartInput['options'],
): ChartStick['marks'] {
  const printed = (litres: number): string =>
    `${digits.volume(litres)}\u00a0${volumeUnitSigns[volume]}`;
  const candidates = [
    { word: 'outlet', litres: null, depthMm: levels.outletMm, to: 'up' as const },
    ...[
      { word: 'quarter', litres: levels.capacityL / 4 },
      { word: 'half', litres: levels.capacityL / 2 },
    ].map((mark) => ({
      ...mark,
      depthMm: levels.readingOf(mark.litres),
      to: 'nearest' as const,
    })),
    {
      word: 'safe fill',
      litres: levels.safeFillL,
      depthMm: levels.safeFillMm,
      to: 'down' as const,
    },
  ];
  return candidates.flatMap(({ word, litres, depthMm, to }) =>
    depthMm === null
      ? []
      : [
          {
            word,
            volume: litres === null ? null : printed(litres),
            depthMm,
            reading: markReading(depthMm, length, to),
          },
        ],
  );
}
