import { useId, useState } from 'react';
import type { Solid } from '~/domain/tank/kinds/registry';
import type { TankSettings } from '~/domain/tank/settings';
import { sizeKey } from '~/domain/tank/size-key';
import type { TankChange } from '~/domain/tank/tank';
import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { measuredPaths } from './measured-paths';
import { ownPlusMinusNames } from './own-plus-minus-names';
import { parsePlusMinus } from './parse-typed';
import { TypedNumber } from './TypedNumber';

interface OwnPlusMinusProps {
  solid: Solid;
  settings: TankSettings;
  onSettings(change: TankChange): void;
  unit: LengthUnit;
}

const means = { tape: 'by tape', drawing: 'from the drawing', stated: 'as stated' } as const;

/** Sizes that stand as fields at once; of more, those with their own ±, and the others by choice. */
const mostFields = 9;

/** The ± of a solid's sizes in a quiet line; opened, any size may have its own. */
export function OwnPlusMinus({ solid, settings, onSettings, unit }: OwnPlusMinusProps) {
  const id = useId();
  const [open, setOpen] = useState(false);
  const [picked, setPicked] = useState<readonly string[]>([]);
  const { sizePlusMinusMm, measuredBy } = settings;
  const own = settings.ownSizePlusMinusMm ?? {};
  const names = ownPlusMinusNames(solid);
  const sizes = measuredPaths(solid).map((path) => {
    const key = sizeKey(solid.id, path);
    return { key, name: names(path), ownMm: own[key] ?? null };
  });
  const count = sizes.filter(({ ownMm }) => ownMm !== null).length;
  const fields = sizes.filter(
    ({ key, ownMm }) => sizes.length <= mostFields || ownMm !== null || picked.includes(key),
  );
  const others = sizes.filter((size) => !fields.includes(size));
  const set = (key: string, plusMinusMm: number | null) => {
    const { [key]: _old, ...rest } = own;
    const ownSizePlusMinusMm = plusMinusMm === null ? rest : { ...rest, [key]: plusMinusMm };
    onSettings({ ownSizePlusMinusMm });
  };
  if (sizes.length === 0) return null;
  return (
    <div className="basis-full">
      <p className="label">
        ± of these sizes: {formatLengthWithUnit(sizePlusMinusMm, unit)} {means[measuredBy]}
        {count > 0 && `, ${count} with ${count === 1 ? 'its' : 'their'} own`}
        {'. '}
        <button
          type="button"
          className="act-text"
          aria-expanded={open}
          aria-controls={open ? id : undefined}
          onClick={() => setOpen(!open)}
        >
          {open ? 'Close' : 'Give a size its own ±'}
        </button>
      </p>
      {open && (
        <fieldset id={id} className="min-w-0 pt-2">
          <legend className="sr-only">Own ± of sizes of {solid.id}</legend>
          <div className="flex flex-wrap items-start gap-x-4 gap-y-2">
            {fields.map(({ key, name, ownMm }) => (
              <div key={key} className={name.length > 12 ? 'w-44' : 'w-24'}>
                <TypedNumber
                  wide
                  label={`± ${name}`}
                  value={ownMm}
                  placeholder={formatLength(sizePlusMinusMm, unit)}
                  parse={parsePlusMinus(unit)}
                  format={(mm) => formatLength(mm, unit)}
                  unit={unit}
                  step={0.5}
                  onValue={(mm) => set(key, mm)}
                  onEmpty={() => set(key, null)}
                />
              </div>
            ))}
            {others.length > 0 && (
              <div className="w-44">
                <label htmlFor={`${id}-other`} className="label block">
                  {fields.length > 0 ? 'another size' : 'which size?'}
                </label>
                <select
                  id={`${id}-other`}
                  className="typed min-h-8 py-0.5"
                  value=""
                  onChange={(event) => setPicked([...picked, event.target.value])}
                >
                  <option value="">choose</option>
                  {others.map(({ key, name }) => (
                    <option key={key} value={key}>
                      {name}
                    </option>
                  ))}
                </select>
              </div>
            )}
          </div>
        </fieldset>
      )}
    </div>
  );
}
