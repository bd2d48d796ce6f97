import { useId, type Dispatch, type ReactNode } from 'react';
import type { FieldFault } from '~/domain/errors';
import { liquidCodes, liquids, type LiquidCode } from '~/domain/liquid/liquids';
import { plusMinusAt, safeFillL, safeFillMm, unusableL } from '~/domain/table/answer-at';
import type { TankDocument } from '~/domain/tank/document';
import { sizePlusMinusByMeans, type TankSettings } from '~/domain/tank/settings';
import type { TankChange } from '~/domain/tank/tank';
import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import { formatVolumeWithPlusMinus } from '~/domain/units/format-volume';
import type { LengthUnit } from '~/domain/units/length-unit';
import type { VolumeUnit } from '~/domain/units/volume-unit';
import { setAttitude, setStick } from '~/scene/commands';
import type { SceneAction } from '~/scene/scene';
import type { LiveTable } from './live-table';
import { NoGas } from '../shared/NoGas';
import { parseBetween, parseHeight, parsePlace, parseSize } from './parse-typed';
import { TypedNumber } from './TypedNumber';
import { WallFields } from './WallFields';

interface TitleBlockProps {
  document: TankDocument;
  dispatch: Dispatch<SceneAction>;
  settings: TankSettings;
  onSettings(change: TankChange): void;
  settingsFaults: readonly FieldFault[];
  shapeFaults: readonly FieldFault[];
  table: LiveTable | null;
  /** z of the floor at the stick, where its zero is when none is typed. */
  floorZ: number | null;
  length: LengthUnit;
  volume: VolumeUnit;
  revisionWords: string;
}

/** The title block of the drawing: what belongs to the tank beside its shape, changed in place. */
export function TitleBlock(props: TitleBlockProps) {
  const { document, dispatch, settings, onSettings, table, length, volume } = props;
  const format = (mm: number) => formatLength(mm, length);
  const brimPlusMinus = table?.brimPlusMinusL ?? 0;
  const safeMm = table ? safeFillMm(table) : null;
  const fault = (key: keyof TankSettings) =>
    props.settingsFaults.find(({ pointer }) => pointer === `/${key}`)?.detail;
  const shapeFault = (start: string) =>
    props.shapeFaults.find(({ pointer }) => pointer.startsWith(start))?.detail;
  const attitude = document.attitude ?? { pitch: 0, roll: 0 };
  const tilt = parseBetween(-60, 60, 'A slope lies within ± 60°.');

  return (
    <section aria-label="Title block" className="grid grid-cols-1 content-start sm:grid-cols-2">
      <Cell>
        <LiquidField settings={settings} onSettings={onSettings} />
        {settings.liquid === 'other' && (
          <TypedNumber
            wide
            label="density"
            unit="kg/m³"
            value={settings.densityKgPerM3}
            parse={parseBetween(400, 3000, 'A density lies between 400 and 3000 kg/m³.')}
            format={String}
            step={10}
            fault={fault('densityKgPerM3')}
            onValue={(densityKgPerM3) => onSettings({ densityKgPerM3 })}
          />
        )}
      </Cell>
      <Cell>
        <WallFields
          document={document}
          dispatch={dispatch}
          length={length}
          fault={shapeFault('/wall')}
        />
        <MeasuredField
          settings={settings}
          onSettings={onSettings}
          length={length}
          fault={fault('sizePlusMinusMm')}
        />
      </Cell>
      <Cell label="Brim, computed">
        <p className="font-semibold text-lead">
          {table
            ? formatVolumeWithPlusMinus(table.capacityL, volume, brimPlusMinus)
            : 'not computed yet'}
        </p>
      </Cell>
      <Cell>
        <TypedNumber
          wide
          label="Safe fill, % of brim"
          unit="%"
          value={settings.safeFillPercent}
          parse={parseBetween(1, 100, 'Safe fill lies between 1 and 100 % of brim.')}
          format={String}
          fault={fault('safeFillPercent')}
          onValue={(safeFillPercent) => onSettings({ safeFillPercent })}
        />
        {table && (
          <p className="font-semibold">
            {formatVolumeWithPlusMinus(
              safeFillL(table),
              volume,
              (brimPlusMinus * settings.safeFillPercent) / 100,
            )}
            {safeMm !== null &&
              ` at ${formatLengthWithUnit(safeMm, length, length === 'mm' ? 0 : 1)}`}
          </p>
        )}
      </Cell>
      <Cell>
        <TypedNumber
          wide
          label="Outlet, height on the stick"
          unit={length}
          value={settings.outletMm}
          placeholder="not told"
          parse={parseHeight(length)}
          format={format}
          fault={fault('outletMm')}
          onValue={(outletMm) => onSettings({ outletMm })}
          onEmpty={() => onSettings({ outletMm: null })}
        />
        {table && (
          <p className="font-semibold">
            {settings.outletMm === null
              ? 'all counted usable'
              : `${formatVolumeWithPlusMinus(unusableL(table), volume, plusMinusAt(table, Math.min(settings.outletMm, table.heightMm)))} unusable`}
          </p>
        )}
      </Cell>
      <Cell label="Stands">
        <div className="flex gap-4">
          <TypedNumber
            label="pitch, +x low"
            unit="°"
            value={attitude.pitch}
            parse={tilt}
            format={String}
            step={0.5}
            fault={shapeFault('/attitude/pitch')}
            onValue={(pitch) =>
              dispatch({
                type: 'edit',
                name: 'pitch',
                edit: (now) => setAttitude(now, { ...attitude, pitch }),
              })
            }
          />
          <TypedNumber
            label="roll, +y low"
            unit="°"
            value={attitude.roll}
            parse={tilt}
            format={String}
            step={0.5}
            fault={shapeFault('/attitude/roll')}
            onValue={(roll) =>
              dispatch({
                type: 'edit',
                name: 'roll',
                edit: (now) => setAttitude(now, { ...attitude, roll }),
              })
            }
          />
        </div>
      </Cell>
      <Cell label="Stick">
        <StickFields
          document={document}
          dispatch={dispatch}
          length={length}
          floorZ={props.floorZ}
          fault={shapeFault('/stick')}
        />
      </Cell>
      <Cell>
        <TypedNumber
          wide
          label="Reference height, zero to rim"
          unit={length}
          value={settings.referenceHeightMm}
          placeholder="not measured"
          parse={parseSize(length)}
          format={format}
          fault={fault('referenceHeightMm')}
          onValue={(referenceHeightMm) => onSettings({ referenceHeightMm })}
          onEmpty={() => onSettings({ referenceHeightMm: null })}
        />
        <p className="label mt-2">Revision</p>
        <p className="font-semibold">{props.revisionWords}</p>
      </Cell>
    </section>
  );
}

function Cell({ label, children }: { label?: string; children: ReactNode }) {
  return (
    <div className="border-b border-hair px-4 py-3 sm:odd:border-r">
      {label && <p className="label">{label}</p>}
      {children}
    </div>
  );
}

function LiquidField(props: Pick<TitleBlockProps, 'settings' | 'onSettings'>) {
  const id = useId();
  return (
    <>
      <label htmlFor={id} className="label">
        Liquid
      </label>
      <select
        id={id}
        className="typed min-h-8 py-0.5 font-semibold"
        value={props.settings.liquid}
        onChange={(event) => {
          const liquid = event.target.value as LiquidCode;
          props.onSettings({ liquid, densityKgPerM3: null });
        }}
      >
        {liquidCodes.map((code) => (
          <option key={code} value={code}>
            {liquids[code].name}
          </option>
        ))}
      </select>
      <NoGas />
    </>
  );
}

function MeasuredField(
  props: Pick<TitleBlockProps, 'settings' | 'onSettings' | 'length'> & {
    fault: string | undefined;
  },
) {
  const { settings, onSettings, length } = props;
  const id = useId();
  return (
    <div className="flex flex-wrap gap-x-4">
      <div className="min-w-32 flex-1">
        <label htmlFor={id} className="label">
          Sizes measured by
        </label>
        <select
          id={id}
          className="typed min-h-8 py-0.5 font-semibold"
          value={settings.measuredBy}
          onChange={(event) => {
            const measuredBy = event.target.value as TankSettings['measuredBy'];
            onSettings(
              measuredBy === 'stated'
                ? { measuredBy }
                : {
                    measuredBy,
                    sizePlusMinusMm: sizePlusMinusByMeans[measuredBy],
                  },
            );
          }}
        >
          <option value="tape">tape, ± 2 mm</option>
          <option value="drawing">drawing, ± 1 mm</option>
          <option value="stated">stated ±</option>
        </select>
      </div>
      {settings.measuredBy === 'stated' && (
        <TypedNumber
          label="± of a size"
          unit={length}
          value={settings.sizePlusMinusMm}
          parse={parseHeight(length)}
          format={(mm) => formatLength(mm, length)}
          fault={props.fault}
          onValue={(sizePlusMinusMm) => onSettings({ sizePlusMinusMm })}
        />
      )}
    </div>
  );
}

function StickFields(props: {
  document: TankDocument;
  dispatch: Dispatch<SceneAction>;
  length: LengthUnit;
  floorZ: number | null;
  fault: string | undefined;
}) {
  const { document, dispatch, length, floorZ, fault } = props;
  const { stick } = document;
  const format = (mm: number) => formatLength(mm, length);
  if (!stick) {
    return (
      <>
        <p className="font-semibold">none: depth is plumb, from the lowest point</p>
        <button
          type="button"
          className="act-text"
          onClick={() =>
            dispatch({
              type: 'edit',
              name: 'add the stick',
              edit: (now) => setStick(now, { at: [0, 0] }),
            })
          }
        >
          Stand a stick in it
        </button>
      </>
    );
  }
  const place = (axis: 0 | 1, value: number) =>
    dispatch({
      type: 'edit',
      name: 'place of the stick',
      edit: (now) => {
        const at: [number, number] = [...(now.stick?.at ?? stick.at)];
        at[axis] = value;
        return setStick(now, { ...stick, at });
      },
    });
  return (
    <>
      <div role="group" aria-label="Place of the stick" className="flex flex-wrap gap-x-4">
        <TypedNumber
          label="at x"
          value={stick.at[0]}
          parse={parsePlace(length)}
          format={format}
          onValue={(x) => place(0, x)}
        />
        <TypedNumber
          label="y"
          value={stick.at[1]}
          parse={parsePlace(length)}
          format={format}
          onValue={(y) => place(1, y)}
        />
        <TypedNumber
          label="zero at z"
          value={stick.zero ?? null}
          placeholder={floorZ === null ? 'floor' : `floor, ${format(floorZ)}`}
          parse={parsePlace(length)}
          format={format}
          onValue={(zero) =>
            dispatch({
              type: 'edit',
              name: 'zero of the stick',
              edit: (now) => setStick(now, { ...stick, zero }),
            })
          }
          onEmpty={() =>
            dispatch({
              type: 'edit',
              name: 'zero of the stick',
              edit: (now) => setStick(now, { at: stick.at }),
            })
          }
        />
      </div>
      {fault && (
        <p className="fault" role="alert">
          {fault}
        </p>
      )}
      <button
        type="button"
        className="act-text"
        onClick={() =>
          dispatch({
            type: 'edit',
            name: 'remove the stick',
            edit: (now) => setStick(now, undefined),
          })
        }
      >
        Take the stick away
      </button>
    </>
  );
}
