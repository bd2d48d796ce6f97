import { useId, useState, type Dispatch } from 'react';
import type { FieldFault } from '~/domain/errors';
import type { TankDocument } from '~/domain/tank/document';
import { kindOf, type Solid } from '~/domain/tank/kinds/registry';
import type { TankSettings } from '~/domain/tank/settings';
import type { TankChange } from '~/domain/tank/tank';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { changeSolid, renameSolid, setPlace, setRole, setTurn } from '~/scene/commands';
import type { SceneAction } from '~/scene/scene';
import { EdgeFields } from './EdgeFields';
import { EndFields } from './EndFields';
import { OwnPlusMinus } from './OwnPlusMinus';
import { parseBetween, parsePlace } from './parse-typed';
import { faultAtOf } from './part-faults';
import { ProfileFields } from './ProfileFields';
import { ShiftFields } from './ShiftFields';
import { SizeField } from './SizeField';
import { StationFields } from './StationFields';
import { stepOf } from './step-of';
import { TipToTip } from './TipToTip';
import { TypedNumber } from './TypedNumber';

interface SolidFieldsProps {
  solid: Solid;
  document: TankDocument;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  settings: TankSettings;
  onSettings(change: TankChange): void;
  /** Pointers relative to the solid: `/height`. */
  faults: readonly FieldFault[];
}

const axes = ['x', 'y', 'z'] as const;

/** Everything of one solid, typed: name, what it does, sizes, place and turn. */
export function SolidFields(props: SolidFieldsProps) {
  const { solid, document, dispatch, unit, settings, onSettings, faults } = props;
  const kind = kindOf(solid);
  const format = (mm: number) => formatLength(mm, unit);
  const step = stepOf(unit);
  const faultAt = faultAtOf(faults);
  const whole = faults.filter(({ pointer }) => pointer === '');
  const edit = (name: string, change: (now: TankDocument) => TankDocument) =>
    dispatch({ type: 'edit', name, edit: change });

  return (
    <div className="flex flex-wrap items-start gap-x-7 gap-y-3 pt-1">
      <div className="flex flex-wrap items-start gap-x-4 gap-y-2">
        <NameField solid={solid} document={document} dispatch={dispatch} />
        <RoleField
          solid={solid}
          onRole={(role) => edit(`${solid.id} ${role}`, (now) => setRole(now, solid.id, role))}
        />
        {kind.axes && (
          <AxisField
            axis={axisOf(solid) ?? kind.axes.usual}
            choices={kind.axes.choices}
            onAxis={(axis) =>
              edit(`axis of ${solid.id}`, (now) =>
                changeSolid(now, solid.id, (one) => ({ ...one, axis }) as Solid),
              )
            }
          />
        )}
      </div>
      <SizesOf solid={solid} dispatch={dispatch} unit={unit} faultAt={faultAt} />
      <fieldset className="flex items-start gap-x-3">
        <legend className="sr-only">Place of {solid.id}: its lowest corner before turning</legend>
        {axes.map((axis, index) => (
          <TypedNumber
            key={axis}
            label={index === 0 ? 'at x' : axis}
            value={solid.at?.[index] ?? 0}
            parse={parsePlace(unit)}
            format={format}
            step={step}
            fault={faultAt(`/at/${index}`)}
            onValue={(value) =>
              edit(`place of ${solid.id}`, (now) =>
                setPlace(now, solid.id, index as 0 | 1 | 2, value),
              )
            }
          />
        ))}
      </fieldset>
      <fieldset className="flex items-start gap-x-3">
        <legend className="sr-only">Turn of {solid.id} about its middle, degrees</legend>
        {axes.map((axis, index) => (
          <TypedNumber
            key={axis}
            label={index === 0 ? 'turned about x' : axis}
            value={solid.turn?.[index] ?? 0}
            parse={parseBetween(-360, 360, 'An angle lies within ± 360°.')}
            format={(value) => String(value)}
            unit="°"
            fault={faultAt(`/turn/${index}`)}
            onValue={(value) =>
              edit(`turn of ${solid.id}`, (now) =>
                setTurn(now, solid.id, index as 0 | 1 | 2, value),
              )
            }
          />
        ))}
      </fieldset>
      <OwnPlusMinus solid={solid} settings={settings} onSettings={onSettings} unit={unit} />
      {whole.map(({ detail }) => (
        <p key={detail} className="fault basis-full" role="alert">
          {detail}
        </p>
      ))}
    </div>
  );
}

/** The sizes that a kind has one by one, and what it is otherwise made of: ends, edges, points. */
function SizesOf({ solid, ...rest }: Omit<Parameters<typeof SizeField>[0], 'size' | 'label'>) {
  const sizes = kindOf(solid).sizes(solid);
  const plain = sizes.filter(({ path }) => !(elsewhere[solid.kind] ?? []).includes(path[0]!));
  return (
    <fieldset className="flex min-w-0 flex-wrap items-start gap-x-7 gap-y-3">
      <legend className="sr-only">Sizes of {solid.id}</legend>
      {plain.length > 0 && (
        <div className="flex flex-wrap items-start gap-x-3 gap-y-2">
          {plain.map((size) => (
            <SizeField key={size.path.join('/')} solid={solid} size={size} {...rest} />
          ))}
          {solid.kind === 'cylinder' && <TipToTip solid={solid} unit={rest.unit} />}
        </div>
      )}
      {solid.kind === 'box' && <EdgeFields solid={solid} {...rest} />}
      {solid.kind === 'cylinder' && <EndFields solid={solid} {...rest} />}
      {solid.kind === 'taper' && <ShiftFields solid={solid} {...rest} />}
      {solid.kind === 'prism' && <ProfileFields solid={solid} {...rest} />}
      {solid.kind === 'stations' && <StationFields solid={solid} {...rest} />}
    </fieldset>
  );
}

/** Where sizes of a kind are typed in fields of their own, by where they stand in its entry. */
const elsewhere: Partial<Record<Solid['kind'], readonly string[]>> = {
  box: ['edges'],
  cylinder: ['ends'],
  taper: ['shift'],
  prism: ['profile'],
  stations: ['stations'],
};

function NameField(props: Pick<SolidFieldsProps, 'solid' | 'document' | 'dispatch'>) {
  const { solid, document, dispatch } = props;
  const id = useId();
  const [draft, setDraft] = useState<string | null>(null);
  const wanted = draft?.trim() ?? solid.id;
  const renamed = wanted === '' ? null : renameSolid(document, solid.id, wanted);
  const fault =
    wanted === ''
      ? 'Give the solid a name.'
      : renamed === null
        ? 'Another solid has this name: each is given once.'
        : null;
  const take = () => {
    if (draft === null || fault !== null) return;
    if (wanted !== solid.id) {
      dispatch({
        type: 'edit',
        name: `name of ${solid.id}`,
        select: wanted,
        edit: (now) => renameSolid(now, solid.id, wanted) ?? now,
      });
    }
    setDraft(null);
  };
  return (
    <div className="w-32">
      <label htmlFor={id} className="label block whitespace-nowrap">
        name
      </label>
      <input
        id={id}
        className="typed min-h-8 py-0.5"
        value={draft ?? solid.id}
        maxLength={64}
        aria-invalid={fault !== null}
        aria-describedby={fault ? `${id}-fault` : undefined}
        onChange={(event) => setDraft(event.target.value)}
        onBlur={take}
        onKeyDown={(event) => {
          if (event.key === 'Enter') take();
          if (event.key === 'Escape') setDraft(null);
        }}
      />
      {fault && (
        <p id={`${id}-fault`} className="fault">
          {fault}
        </p>
      )}
    </div>
  );
}

function RoleField({ solid, onRole }: { solid: Solid; onRole(role: Solid['role']): void }) {
  const id = useId();
  return (
    <div className="w-28">
      <label htmlFor={id} className="label block whitespace-nowrap">
        does
      </label>
      <select
        id={id}
        className="typed min-h-8 py-0.5"
        value={solid.role}
        onChange={(event) => onRole(event.target.value as Solid['role'])}
      >
        <option value="holds">holds</option>
        <option value="displaces">displaces</option>
      </select>
    </div>
  );
}

type Axis = 'x' | 'y' | 'z';

const axisWords: Record<Axis, string> = {
  x: 'x, lying along',
  y: 'y, lying across',
  z: 'z, standing',
};

function axisOf(solid: Solid): Axis | undefined {
  return 'axis' in solid ? solid.axis : undefined;
}

function AxisField(props: { axis: Axis; choices: readonly Axis[]; onAxis(axis: Axis): void }) {
  const id = useId();
  return (
    <div className="w-30">
      <label htmlFor={id} className="label block whitespace-nowrap">
        axis
      </label>
      <select
        id={id}
        className="typed min-h-8 py-0.5"
        value={props.axis}
        onChange={(event) => props.onAxis(event.target.value as Axis)}
      >
        {props.choices.map((axis) => (
          <option key={axis} value={axis}>
            {axisWords[axis]}
          </option>
        ))}
      </select>
    </div>
  );
}
