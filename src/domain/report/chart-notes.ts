import { cautions, cautionsFor, stickCaution } from '../liquid/cautions';
import { densitySentence } from '../liquid/density-sentence';
import { stickNoticeSentence } from '../table/stick-notice-sentence';
import { ownSizesWords } from '../tank/own-sizes';
import { formatLengthWithUnit } from '../units/format-length';
import { formatNumber } from '../units/format-number';
import type { ChartInput } from './chart-input';
import type { ChartNote, ChartRow } from './chart-report';
import type { Sketch } from './sketch';
import { standsSentence } from './stands-sentence';

/** The words at the foot of the first page: how to dip, how the figures came about, what to take care of. */
export function chartNotes(
  input: ChartInput,
  sketch: Sketch | null,
  rows: readonly ChartRow[],
): ChartNote[] {
  return [
    {
      title: 'Take care',
      caution: true,
      sentences: cautionsFor(input.settings.liquid, input.capacityL)
        .filter((key) => key !== 'not-for-trade')
        .map((key) => cautions[key]),
    },
    { title: 'To dip', caution: false, sentences: dipSentences(input, sketch) },
    { title: 'These figures', caution: false, sentences: figureSentences(input, rows) },
  ];
}

function dipSentences(input: ChartInput, sketch: Sketch | null): string[] {
  const { settings, options, design, heightMm } = input;
  const length = (mm: number): string => formatLengthWithUnit(mm, options.length);
  const sentences: string[] = [];
  if (design.stick === undefined) {
    sentences.push('Depth is plumb height above the lowest point inside.');
  } else {
    const place = sketch?.dipPoint ?? null;
    if (place !== null && sketch !== null) {
      const across = sketch.view === 'side' ? 'from its near side' : 'from its near end';
      sentences.push(
        `Dip point: ${length(Math.round(place.fromLeftMm))} from the left of the sketch, ${length(Math.round(place.fromNearMm))} ${across}.`,
      );
    }
    sentences.push(zeroSentence(input, place?.zeroAboveLowestMm ?? null));
    if (settings.referenceHeightMm !== null) {
      sentences.push(
        `Reference height, zero to the rim of the dip hole: ${length(settings.referenceHeightMm)}. If yours differs, the stick or the tank has changed.`,
      );
    }
  }
  sentences.push(
    `Read the wet edge. A reading above ${length(heightMm)} is no depth of this tank.`,
    ...(sketch?.stickNotices ?? []).map((notice) => stickNoticeSentence(notice, options.length)),
    stickCaution,
    standsSentence(design, sketch?.view ?? 'side'),
  );
  return sentences;
}

function zeroSentence({ design, options }: ChartInput, aboveLowestMm: number | null): string {
  const lowest =
    aboveLowestMm === null || Math.abs(aboveLowestMm) < 0.5
      ? ''
      : `, ${formatLengthWithUnit(Math.abs(aboveLowestMm), options.length, options.length === 'cm' ? 1 : 0)} ${aboveLowestMm > 0 ? 'above' : 'below'} the lowest point inside`;
  return design.stick?.zero === undefined
    ? `Zero is the floor under the dip point${lowest}.`
    : `Zero was set for this stick${lowest}.`;
}

const means = {
  tape: 'by tape',
  drawing: 'from a drawing',
  stated: 'as stated',
} as const;

function figureSentences(
  { design, settings, options, errorL, revision }: ChartInput,
  rows: readonly ChartRow[],
): string[] {
  const note = revision.note?.trim() ?? '';
  const small = (mm: number): string =>
    options.length === 'in'
      ? `${formatNumber(mm, mm % 1 === 0 ? 0 : 1)}\u00a0mm (${formatNumber(mm / 25.4, 2)}\u00a0in)`
      : formatLengthWithUnit(mm, options.length);
  const sizes = design.wall?.sizes === 'outside' ? 'outside sizes less the wall' : 'inside sizes';
  return [
    `Computed from ${sizes} ${means[settings.measuredBy]}, each ±\u00a0${small(settings.sizePlusMinusMm)}${ownSizesWords(design, settings)}; not metered.`,
    `± is a 95\u00a0% interval. It covers the litres, usable and room of its row and holds for a dip read to ±\u00a0${small(settings.dipPlusMinusMm)}.`,
    `Computing itself adds less than ${atMost(errorL)}\u00a0L.`,
    densitySentence(settings),
    ...(rows.some(({ region }) => region === 'headroom') ? ['“over”: above safe fill.'] : []),
    ...(note === '' ? [] : [`Note of this revision: ${note}`]),
  ];
}

/** The bound in one digit, rounded up: 0.001, 0.02 … */
function atMost(errorL: number): string {
  const least = 0.001;
  const bound = Math.max(errorL, least);
  const exponent = Math.floor(Math.log10(bound) + 1e-12);
  const digit = 10 ** exponent;
  return formatNumber(Math.ceil(bound / digit - 1e-9) * digit, Math.max(0, -exponent));
}
