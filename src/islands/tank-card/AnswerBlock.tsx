import { liquids } from '~/domain/liquid/liquids';
import { densityOf, type Answer } from '~/domain/table/answer-at';
import type { TankSettings } from '~/domain/tank/settings';
import { formatMass } from '~/domain/units/format-mass';
import { formatPlusMinus, formatVolume } from '~/domain/units/format-volume';
import { volumeUnitSigns, type VolumeUnit } from '~/domain/units/volume-unit';

/**
 * The answer to a dip, the biggest thing on the page: usable litres, or the room left where a full
 * tank is the emergency. Every figure under its own name.
 */
export function AnswerBlock({
  answer,
  settings,
  unit,
}: {
  answer: Answer;
  settings: TankSettings;
  unit: VolumeUnit;
}) {
  const waste = liquids[settings.liquid].watch === 'high';
  const sign = volumeUnitSigns[unit];
  const volume = (litres: number) => formatVolume(litres, unit, answer.plusMinusL);
  const usableName = settings.outletMm === null ? 'usable (no outlet told)' : 'usable';
  const kilograms = formatMass(answer.massKg, (answer.plusMinusL * densityOf(settings)) / 1000);
  return (
    <div aria-live="polite">
      <p data-testid="answer" className="text-answer font-bold whitespace-nowrap sm:text-huge">
        {volume(waste ? answer.roomL : answer.usableL)}{' '}
        <span className="text-[0.5em] font-semibold">{sign}</span>
      </p>
      <p className="mt-1 text-lead">
        {waste ? 'room to safe fill' : usableName}, ± {formatPlusMinus(answer.plusMinusL, unit)}
      </p>
      <ul className="mt-4 grid gap-1">
        {waste ? (
          <Figure figure={volume(answer.volumeL)} unit={sign} name="in the tank" />
        ) : (
          <Figure figure={volume(answer.roomL)} unit={sign} name="room to safe fill" />
        )}
        <Figure figure={kilograms} unit="kg" name="in the tank" />
        {!waste && settings.outletMm !== null && (
          <Figure figure={volume(answer.volumeL)} unit={sign} name="total, unusable too" />
        )}
      </ul>
      {answer.aboveSafeFillL > 0 && (
        <p className="fault mt-3">
          {answer.aboveSafeFillL > answer.plusMinusL
            ? `${volume(answer.aboveSafeFillL)} ${sign} above safe fill: put no more in.`
            : 'At safe fill: put no more in.'}
        </p>
      )}
    </div>
  );
}

function Figure({ figure, unit, name }: { figure: string; unit: string; name: string }) {
  return (
    <li>
      <strong className="font-semibold">
        {figure} {unit}
      </strong>{' '}
      {name}
    </li>
  );
}
