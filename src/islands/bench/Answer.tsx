import {
  answerAt,
  densityOf,
  safeFillL,
  safeFillMm,
  type DipTable,
} from '~/domain/table/answer-at';
import { liquids } from '~/domain/liquid/liquids';
import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import { formatMass } from '~/domain/units/format-mass';
import { formatPlusMinus, formatVolume } from '~/domain/units/format-volume';
import type { LengthUnit } from '~/domain/units/length-unit';
import { volumeUnitSigns, type VolumeUnit } from '~/domain/units/volume-unit';
import { parseHeight } from './parse-typed';
import { sentenceToRemember } from './remember';
import { TypedNumber } from './TypedNumber';

interface AnswerProps {
  table: DipTable;
  depthMm: number;
  onDepth(mm: number): void;
  stands: string;
  length: LengthUnit;
  volume: VolumeUnit;
}

/** What the reading says, biggest on the page; and the sentence that stays in the head. */
export function Answer({ table, depthMm, onDepth, stands, length, volume }: AnswerProps) {
  const answer = answerAt(table, depthMm);
  const waste = liquids[table.settings.liquid].watch === 'high';
  const sign = volumeUnitSigns[volume];
  const written = (litres: number) => formatVolume(litres, volume, answer.plusMinusL);
  const density = densityOf(table.settings);
  const weight = Number.isFinite(density)
    ? `${formatMass(answer.massKg, (answer.plusMinusL * density) / 1000)} kg`
    : 'no weight before the density is typed';
  const top = safeFillMm(table);
  const parse = (text: string) => {
    const parsed = parseHeight(length)(text);
    if ('refused' in parsed || parsed.value <= table.heightMm + 1e-6) return parsed;
    return {
      refused: `The stick ends at ${formatLengthWithUnit(table.heightMm, length)}: give less.`,
    };
  };
  return (
    <section aria-label="At the wet line" className="flex flex-col gap-4">
      <p className="text-lead font-semibold">
        {sentenceToRemember(table.curve, table.heightMm, table.capacityL)}
      </p>
      <div className="w-36">
        <TypedNumber
          wide
          label="depth on the stick"
          value={depthMm}
          unit={length}
          step={length === 'in' ? 25.4 / 8 : 1}
          parse={parse}
          format={(mm) => formatLength(mm, length)}
          onValue={(mm) => onDepth(Math.min(mm, table.heightMm))}
        />
      </div>
      <div aria-live="polite" aria-atomic="true">
        <p className="label">computed, {stands}</p>
        <p className="whitespace-nowrap font-semibold text-answer" data-testid="answer">
          {written(waste ? answer.roomL : answer.usableL)} {sign}
        </p>
        <p className="text-lead">
          {waste ? 'room left' : 'usable'}, ± {formatPlusMinus(answer.plusMinusL, volume)}
        </p>
        <p className="text-lead">
          {waste
            ? `${written(answer.volumeL)} ${sign} in the tank`
            : `${written(answer.roomL)} ${sign} room to safe fill`}
        </p>
        <p className="text-lead">{weight}</p>
        {answer.aboveSafeFillL > 0 && (
          <p className="fault mt-1">
            Above safe fill, {formatVolume(safeFillL(table), volume, answer.plusMinusL)} {sign}
            {top !== null && ` at ${formatLengthWithUnit(top, length)}`}.
          </p>
        )}
      </div>
    </section>
  );
}
