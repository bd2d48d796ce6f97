import { lengthUnits, lengthUnitWords } from '~/domain/units/length-unit';
import { volumeUnits, volumeUnitWords } from '~/domain/units/volume-unit';
import { useUnitsPreference } from './units-preference';
import { useAwake } from './use-awake';

/** Units of one person, remembered; every figure on the page follows. */
export function UnitsChooser({ person }: { person: string }) {
  const awake = useAwake();
  const [units, change] = useUnitsPreference(person);
  return (
    <fieldset disabled={!awake} className="flex flex-wrap gap-x-6 gap-y-3">
      <legend className="sr-only">Units</legend>
      <label className="label min-w-32 flex-1">
        Depth in
        <select
          className="typed text-base"
          value={units.length}
          onChange={(event) =>
            change({ length: event.target.value as (typeof lengthUnits)[number] })
          }
        >
          {lengthUnits.map((unit) => (
            <option key={unit} value={unit}>
              {lengthUnitWords[unit]}
            </option>
          ))}
        </select>
      </label>
      <label className="label min-w-32 flex-1">
        Volume in
        <select
          className="typed text-base"
          value={units.volume}
          onChange={(event) =>
            change({ volume: event.target.value as (typeof volumeUnits)[number] })
          }
        >
          {volumeUnits.map((unit) => (
            <option key={unit} value={unit}>
              {volumeUnitWords[unit]}
            </option>
          ))}
        </select>
      </label>
    </fieldset>
  );
}
