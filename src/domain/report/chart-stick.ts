import { formatLength } from '../units/format-length';
import { mmPerLengthUnit } from '../units/length-unit';
import { marksFor, multiples } from '../units/marks';
import { volumeUnitSigns } from '../units/volume-unit';
import type { ChartDigits } from './chart-digits';
import { stopReading } from './chart-figures';
import type { ChartInput } from './chart-input';
import type { ChartLevels } from './chart-levels';
import type { ChartStick, ChartTick } from './chart-report';

const mostNumbered = 14;
const mostFine = 130;

/** The stick of the print: its marks, its regions and the readings worth a word. */
export function chartStick(
  { options, heightMm }: ChartInput,
  levels: ChartLevels,
  digits: ChartDigits,
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
  digits: ChartDigits,
  { volume, length }: ChartInput['options'],
): ChartStick['marks'] {
  const sign = volumeUnitSigns[volume];
  const withVolume = (word: string, litres: number): string =>
    `${word}\u00a0${digits.volume(litres)}\u00a0${sign}`;
  const candidates = [
    { label: 'outlet', depthMm: levels.outletMm },
    {
      label: withVolume('quarter', levels.capacityL / 4),
      depthMm: levels.readingOf(levels.capacityL / 4),
    },
    {
      label: withVolume('half', levels.capacityL / 2),
      depthMm: levels.readingOf(levels.capacityL / 2),
    },
    { label: withVolume('safe fill', levels.safeFillL), depthMm: levels.safeFillMm },
  ];
  return candidates.flatMap(({ label, depthMm }) =>
    depthMm === null ? [] : [{ label, depthMm, reading: stopReading(depthMm, length) }],
  );
}
