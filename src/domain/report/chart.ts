import { invalid } from '../errors';
import { cautions } from '../liquid/cautions';
import { liquids } from '../liquid/liquids';
import { formatLength } from '../units/format-length';
import { lengthUnitWords } from '../units/length-unit';
import { volumeUnitWords } from '../units/volume-unit';
import { tableDigits } from '../units/table-digits';
import { chartFigures } from './chart-figures';
import type { ChartInput } from './chart-input';
import { chartLevels } from './chart-levels';
import { chartNotes } from './chart-notes';
import type { ChartReport, ChartSketch } from './chart-report';
import { chartColumns, chartRows, rowGroup } from './chart-rows';
import { chartStick } from './chart-stick';
import { printDate } from './print-date';
import type { Sketch } from './sketch';

/** Most rows of one print: a larger step is asked for beyond it. */
const mostChartRows = 2000;

/**
 * The chart of a frozen revision as plain data: every word and figure in its print form. Pure; the
 * same input gives the same report. Throws `invalid` when the chosen step gives too many rows.
 */
export function buildChart(input: ChartInput): ChartReport {
  const { options, revision, settings, heightMm } = input;
  if (options.stepMm !== undefined && heightMm / options.stepMm > mostChartRows) {
    throw invalid(
      '/stepMm',
      `A chart has at most ${mostChartRows} rows: choose a step of ${Math.ceil(heightMm / mostChartRows)} mm or more.`,
    );
  }
  const levels = chartLevels(input);
  const digits = tableDigits(options.volume, levels.largestPlusMinusL, levels.densityKgPerM3);
  const { sketch } = input;
  const columns = chartColumns(input);
  const rows = chartRows(input, levels, digits, columns);
  const liquid = liquids[settings.liquid].name;
  const date = printDate(revision.issuedAt);
  return {
    paper: options.paper,
    title: `${input.tankName}, ${input.installation.name}: dip chart, revision ${revision.letter}`,
    author: input.workshopName,
    issuedAt: revision.issuedAt,
    liquid,
    tank: input.tankName,
    installation: input.installation.name,
    workshop: input.workshopName,
    lengthWords: lengthUnitWords[options.length],
    volumeWords: volumeUnitWords[options.volume],
    revision: `Revision ${revision.letter}`,
    superseded: revision.current
      ? null
      : `Superseded: a later revision than ${revision.letter} stands. Do not use this print.`,
    box: chartFigures(input, levels, digits),
    stick: chartStick(input, levels, digits),
    sketch: sketch === null ? null : withTexts(sketch, input),
    columns,
    rows,
    rowGroup: rowGroup(input),
    notes: chartNotes(input, sketch, rows),
    trade: cautions['not-for-trade'],
    titleBlock: [
      { label: 'Tank', text: input.tankName },
      { label: kindLabels[input.installation.kind], text: input.installation.name },
      { label: 'Workshop', text: input.workshopName },
      {
        label: 'Revision',
        text:
          revision.replaces === null
            ? `${revision.letter}, first issue`
            : `${revision.letter}, replaces ${revision.replaces}`,
      },
      { label: 'Issued', text: `${date}, ${revision.issuedBy}` },
      { label: 'Table code', text: shortHash(revision.hash) },
    ],
  };
}

const kindLabels = { vehicle: 'Vehicle', boat: 'Boat', place: 'Place' } as const;

/** The first eight digits of the revision's hash, in two groups: enough to tell two tables apart by eye. */
function shortHash(hash: string): string {
  return `${hash.slice(0, 4)} ${hash.slice(4, 8)}`;
}

function withTexts(
  sketch: Sketch,
  { settings, options, levelPerReading }: ChartInput,
): ChartSketch {
  const { outletMm } = settings;
  const zeroY = levelPerReading === 1 ? (sketch.stick?.zeroY ?? null) : null;
  const text = (mm: number): string => formatLength(Math.round(mm), options.length);
  return {
    ...sketch,
    widthText: text(sketch.widthMm),
    heightText: text(sketch.heightMm),
    outletY: zeroY === null || outletMm === null ? null : zeroY + outletMm,
  };
}
