import { useState, type Dispatch } from 'react';
import type { Prism } from '~/domain/tank/kinds/prism/schema';
import type { LengthUnit } from '~/domain/units/length-unit';
import { formatLength } from '~/domain/units/format-length';
import {
  addProfilePoint,
  removeProfilePoint,
  replaceProfile,
  setProfileNumber,
  type ProfilePoint,
} from '~/scene/prism-profile';
import type { SceneAction } from '~/scene/scene';
import { OutlineSketch } from './OutlineSketch';
import { parseHeight, parsePlace } from './parse-typed';
import type { FaultAt } from './part-faults';
import { PointTable } from './PointTable';

interface ProfileFieldsProps {
  solid: Prism;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  faultAt: FaultAt;
}

/** The outline of a prism: its points in a table, and what they make beside it. */
export function ProfileFields({ solid, dispatch, unit, faultAt }: ProfileFieldsProps) {
  const [chosen, setChosen] = useState<number | null>(null);
  const { id, profile } = solid;
  const edit = (name: string, change: Parameters<typeof editOf>[1]) =>
    dispatch(editOf(`${name} of ${id}`, change));
  const fault = faultAt('/profile');
  return (
    <div className="flex basis-full flex-wrap items-start gap-x-7 gap-y-3">
      <PointTable
        name="profile"
        columns={[
          { label: 'x', parse: parsePlace(unit) },
          { label: 'z', parse: parsePlace(unit) },
          { label: 'radius', parse: parseHeight(unit), mayBeEmpty: true },
        ]}
        rows={profile.map(([x, z, radius]) => [x, z, radius ?? null])}
        format={(mm) => formatLength(mm, unit)}
        faultAt={(row, column) =>
          faultAt(column === null ? `/profile/${row}` : `/profile/${row}/${column}`)
        }
        chosen={chosen}
        onChoose={setChosen}
        onNumber={(row, column, value) =>
          edit(`point ${row + 1}`, (now) =>
            setProfileNumber(now, id, row, column as 0 | 1 | 2, value),
          )
        }
        onRows={(from, rows) =>
          edit('points', (now) => replaceProfile(now, id, from, rows.map(pointOf)))
        }
        onAdd={(after) => edit('a point', (now) => addProfilePoint(now, id, after))}
        onRemove={(row) => edit(`point ${row + 1}`, (now) => removeProfilePoint(now, id, row))}
        least={3}
        most={200}
      />
      <OutlineSketch
        label={`Outline of ${id}`}
        points={profile.map(([across, up, radius]) => ({ across, up, radius }))}
        chosen={chosen !== null && chosen < profile.length ? chosen : null}
      />
      {fault && (
        <p className="fault basis-full" role="alert">
          {fault}
        </p>
      )}
    </div>
  );
}

function editOf(name: string, edit: Extract<SceneAction, { type: 'edit' }>['edit']): SceneAction {
  return { type: 'edit', name, edit };
}

function pointOf([x, z, radius]: readonly (number | null)[]): ProfilePoint {
  const at: [number, number] = [x ?? 0, z ?? 0];
  return radius ? [...at, radius] : at;
}
