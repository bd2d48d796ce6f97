import { useState, type Dispatch } from 'react';
import type { Stations } from '~/domain/tank/kinds/stations/schema';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { setSize } from '~/scene/commands';
import {
  addStation,
  addStationPoint,
  areEven,
  removeStation,
  removeStationPoint,
  replaceStationPoints,
} from '~/scene/hull-stations';
import type { SceneAction } from '~/scene/scene';
import { OutlineSketch } from './OutlineSketch';
import { parsePlace } from './parse-typed';
import type { FaultAt } from './part-faults';
import { PointTable } from './PointTable';
import { SizeField } from './SizeField';

interface StationFieldsProps {
  solid: Stations;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  faultAt: FaultAt;
}

/** Numbers that stand open at once; a hull of more opens at its first station. */
const mostOpen = 120;

/** A hull: a table a station, and the chosen section drawn over the others. */
export function StationFields({ solid, dispatch, unit, faultAt }: StationFieldsProps) {
  const { id, stations } = solid;
  const [chosen, setChosen] = useState<{ station: number; point: number } | null>(null);
  const [open, setOpen] = useState<Readonly<Record<number, boolean>>>({});
  const few = stations.reduce((sum, { profile }) => sum + 2 * profile.length, 0) <= mostOpen;
  const isOpen = (i: number) => open[i] ?? (few || i === 0);
  const edit = (name: string, change: Extract<SceneAction, { type: 'edit' }>['edit']) =>
    dispatch({ type: 'edit', name: `${name} of ${id}`, edit: change });
  const where = areEven(stations) ? ', in every station' : '';
  const shown = Math.min(chosen?.station ?? 0, stations.length - 1);
  const points = stations[shown]!.profile;
  const fault = faultAt('/stations');
  return (
    <div className="grid basis-full gap-y-3">
      <div className="flex flex-wrap items-start gap-x-7 gap-y-4">
        <div className="grid gap-1">
          <OutlineSketch
            label={`Section at station ${shown + 1} of ${id}`}
            points={points.map(sketched)}
            behind={stations
              .filter((_, i) => i !== shown)
              .map(({ profile }) => profile.map(sketched))}
            chosen={chosen && chosen.point < points.length ? chosen.point : null}
          />
          <p className="label">station {shown + 1}, over the others</p>
        </div>
        {stations.map(({ profile }, i) => {
          const name = `station ${i + 1}`;
          const ofProfile = faultAt(`/stations/${i}/profile`);
          return (
            <section key={i} aria-label={name} className="grid min-w-0 gap-1">
              <div className="flex items-end gap-x-3">
                <button
                  type="button"
                  className="act-text mb-1 font-semibold"
                  aria-expanded={isOpen(i)}
                  onClick={() => {
                    setOpen({ ...open, [i]: !isOpen(i) });
                    setChosen({ station: i, point: 0 });
                  }}
                >
                  {name}
                </button>
                <SizeField
                  solid={solid}
                  size={{
                    path: ['stations', String(i), 'x'],
                    label: `${name} x`,
                    unit: 'mm',
                    coordinate: true,
                  }}
                  dispatch={dispatch}
                  unit={unit}
                  faultAt={faultAt}
                />
                <button
                  type="button"
                  className="act-text mb-1"
                  aria-label={`remove ${name}`}
                  disabled={stations.length <= 2}
                  onClick={() => edit(name, (now) => removeStation(now, id, i))}
                >
                  remove
                </button>
              </div>
              {isOpen(i) && (
                <PointTable
                  name={name}
                  columns={[
                    { label: 'y', parse: parsePlace(unit) },
                    { label: 'z', parse: parsePlace(unit) },
                  ]}
                  rows={profile}
                  format={(mm) => formatLength(mm, unit)}
                  faultAt={(row, column) => {
                    const point = `/stations/${i}/profile/${row}`;
                    return faultAt(column === null ? point : `${point}/${column}`);
                  }}
                  chosen={chosen?.station === i ? chosen.point : null}
                  onChoose={(point) => setChosen({ station: i, point })}
                  onNumber={(row, column, value) =>
                    edit(`${name}, point ${row + 1}`, (now) =>
                      setSize(
                        now,
                        id,
                        ['stations', String(i), 'profile', String(row), String(column)],
                        value ?? 0,
                      ),
                    )
                  }
                  onRows={(from, rows) =>
                    edit(`points of ${name}`, (now) =>
                      replaceStationPoints(
                        now,
                        id,
                        i,
                        from,
                        rows.map(([y, z]) => [y ?? 0, z ?? 0]),
                      ),
                    )
                  }
                  onAdd={(after) => edit('a point', (now) => addStationPoint(now, id, i, after))}
                  onRemove={(row) =>
                    edit(`point ${row + 1}`, (now) => removeStationPoint(now, id, i, row))
                  }
                  least={3}
                  most={100}
                  where={where}
                />
              )}
              {ofProfile && (
                <p className="fault max-w-64" role="alert">
                  {ofProfile}
                </p>
              )}
            </section>
          );
        })}
      </div>
      <p className="flex flex-wrap items-baseline gap-x-4">
        <button
          type="button"
          className="act-text"
          disabled={stations.length >= 50}
          onClick={() => edit('a station', (now) => addStation(now, id))}
        >
          Add a station
        </button>
        <span className="label">
          {where === ''
            ? 'Stations have to have as many points as each other.'
            : 'Points come and go in every station, so that point answers point.'}
        </span>
      </p>
      {fault && (
        <p className="fault" role="alert">
          {fault}
        </p>
      )}
    </div>
  );
}

function sketched([across, up]: readonly [number, number]) {
  return { across, up };
}
