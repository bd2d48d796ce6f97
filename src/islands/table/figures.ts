import { tableDigits, type TableDigits } from '~/domain/units/table-digits';
import { answerAt, densityOf, type DipTable } from '~/domain/table/answer-at';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import type { VolumeUnit } from '~/domain/units/volume-unit';

/** One row of a table as it is written. */
export interface RowFigures {
  depth: string;
  litres: string;
  usable: string;
  room: string;
  kg: string;
  plusMinus: string;
}

/** The digits of a whole table: those that its largest ± deserves, so that columns stay straight. */
export function digitsOf(table: DipTable, volume: VolumeUnit): TableDigits {
  const largest = Array.from(table.plusMinusL).reduce((most, one) => Math.max(most, one), 0);
  return tableDigits(volume, largest, densityOf(table.settings));
}

export function rowFigures(
  table: DipTable,
  depthMm: number,
  length: LengthUnit,
  digits: TableDigits,
): RowFigures {
  const answer = answerAt(table, depthMm);
  return {
    depth: formatLength(depthMm, length),
    litres: digits.volume(answer.volumeL),
    plusMinus: digits.plusMinus(answer.plusMinusL),
    usable: digits.volume(answer.usableL),
    room: digits.volume(answer.roomL),
    // a liquid that is not on the list has no weight before its density is typed
    kg: Number.isFinite(answer.massKg) ? digits.mass(answer.massKg) : 'density?',
  };
}
