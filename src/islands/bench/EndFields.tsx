import { useId, type Dispatch } from 'react';
import { kindOf } from '~/domain/tank/kinds/registry';
import type { Cylinder, End } from '~/domain/tank/kinds/cylinder/schema';
import type { Size } from '~/domain/tank/kinds/kind';
import type { LengthUnit } from '~/domain/units/length-unit';
import { setEndForm, setEndInward, tellFlatEnds, type Which } from '~/scene/cylinder-ends';
import type { SceneAction } from '~/scene/scene';
import { EndProfile } from './EndProfile';
import { endName } from './end-names';
import type { FaultAt } from './part-faults';
import { SizeField } from './SizeField';

interface EndFieldsProps {
  solid: Cylinder;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  faultAt: FaultAt;
}

const forms: readonly { form: End['form']; words: string }[] = [
  { form: 'flat', words: 'flat' },
  { form: 'cone', words: 'cone' },
  { form: 'dish', words: 'dished (ball cap)' },
  { form: 'ellipsoid', words: 'elliptical' },
  { form: 'torisphere', words: 'torispherical' },
];

const flat: End = { form: 'flat' };

/** Both ends of a cylinder: their forms are asked, not assumed. */
export function EndFields({ solid, dispatch, unit, faultAt }: EndFieldsProps) {
  const fault = faultAt('/ends');
  return (
    <div className="flex basis-full flex-wrap items-start gap-x-7 gap-y-3">
      {([0, 1] as const).map((which) => (
        <OneEnd
          key={which}
          solid={solid}
          which={which}
          dispatch={dispatch}
          unit={unit}
          faultAt={faultAt}
        />
      ))}
      {solid.ends === undefined && (
        <p className="basis-full text-note">
          The ends are not told: both count as flat.{' '}
          <button
            type="button"
            className="act-text"
            onClick={() =>
              dispatch({
                type: 'edit',
                name: `flat ends of ${solid.id}`,
                edit: (now) => tellFlatEnds(now, solid.id),
              })
            }
          >
            They are flat
          </button>
        </p>
      )}
      {fault && (
        <p className="fault basis-full" role="alert">
          {fault}
        </p>
      )}
    </div>
  );
}

function OneEnd({ solid, which, dispatch, unit, faultAt }: EndFieldsProps & { which: Which }) {
  const id = useId();
  const axis = solid.axis ?? 'x';
  const end = solid.ends?.[which] ?? flat;
  const turned = solid.turn?.some((degrees) => degrees !== 0) ?? false;
  const name = endName(axis, which, turned);
  const fault = faultAt(`/ends/${which}`) ?? faultAt(`/ends/${which}/inward`);
  const sizes = kindOf(solid)
    .sizes(solid)
    .filter(({ path }) => path[0] === 'ends' && path[1] === String(which));
  return (
    <fieldset className="max-w-full min-w-0" aria-describedby={fault ? `${id}-fault` : undefined}>
      <legend className="sr-only">{name}</legend>
      <div className="flex flex-wrap items-start gap-x-3 gap-y-1">
        <div className="w-44">
          <label htmlFor={id} className="label block whitespace-nowrap">
            {name}
          </label>
          <div className="flex items-center gap-2">
            <EndProfile end={end} diameterMm={solid.diameter} axis={axis} which={which} />
            <select
              id={id}
              className="typed min-h-8 py-0.5"
              value={end.form}
              onChange={(event) => {
                const form = event.target.value as End['form'];
                dispatch({
                  type: 'edit',
                  name: `${name} of ${solid.id}`,
                  edit: (now) => setEndForm(now, solid.id, which, form),
                });
              }}
            >
              {forms.map(({ form, words }) => (
                <option key={form} value={form}>
                  {words}
                </option>
              ))}
            </select>
          </div>
        </div>
        {sizes.map((size) => (
          <SizeField
            key={size.path.join('/')}
            solid={solid}
            size={size}
            label={shortLabel(size)}
            dispatch={dispatch}
            unit={unit}
            faultAt={faultAt}
          />
        ))}
        {end.form !== 'flat' && (
          <label className="flex items-center gap-2 self-center pt-4 text-note">
            <input
              type="checkbox"
              className="size-4 accent-current"
              checked={end.inward ?? false}
              onChange={(event) => {
                const inward = event.target.checked;
                dispatch({
                  type: 'edit',
                  name: `${name} of ${solid.id} ${inward ? 'inward' : 'outward'}`,
                  edit: (now) => setEndInward(now, solid.id, which, inward),
                });
              }}
            />
            inward
          </label>
        )}
      </div>
      {fault && (
        <p id={`${id}-fault`} className="fault max-w-80" role="alert">
          {fault}
        </p>
      )}
    </fieldset>
  );
}

/** Beside the end itself its size is plainly "depth". */
function shortLabel({ path }: Size): string {
  return path.at(-1)!;
}
