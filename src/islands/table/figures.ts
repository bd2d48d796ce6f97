import { answerAt, type DipTable } from "~/domain/table/answer-at";
import { densityOf } from "~/domain/table/answer-at";
import { formatLength } from "~/domain/units/format-length";
import { formatMass } from "~/domain/units/format-mass";
import { formatVolume } from "~/domain/units/format-volume";
import type { LengthUnit } from "~/domain/units/length-unit";
import type { VolumeUnit } from "~/domain/units/volume-unit";

/** One row of a table as it is written: every figure with the digits its ± deserves. */
export interface RowFigures {
  depth: string;
  litres: string;
  usable: string;
  room: string;
  kg: string;
}

export function rowFigures(
  table: DipTable,
  depthMm: number,
  length: LengthUnit,
  volume: VolumeUnit,
): RowFigures {
  const answer = answerAt(table, depthMm);
  const written = (litres: number) =>
    formatVolume(litres, volume, answer.plusMinusL);
  return {
    depth: formatLength(depthMm, length),
    litres: written(answer.volumeL),
    usable: written(answer.usableL),
    room: written(answer.roomL),
    kg: formatMass(
      answer.massKg,
      (answer.plusMinusL * densityOf(table.settings)) / 1000,
    ),
  };
}
