import type { Dispatch } from 'react';
import type { Taper } from '~/domain/tank/kinds/taper/schema';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import type { SceneAction } from '~/scene/scene';
import { setTaperShift } from '~/scene/taper-shift';
import { parsePlace } from './parse-typed';
import type { FaultAt } from './part-faults';
import { stepOf } from './step-of';
import { TypedNumber } from './TypedNumber';

interface ShiftFieldsProps {
  solid: Taper;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  faultAt: FaultAt;
}

/** Where the middle of a taper's top stands against the middle of its bottom. */
export function ShiftFields({ solid, dispatch, unit, faultAt }: ShiftFieldsProps) {
  return (
    <div className="flex flex-wrap items-start gap-x-3 gap-y-2">
      {(['x', 'y'] as const).map((axis, i) => (
        <TypedNumber
          key={axis}
          label={`shift ${axis}`}
          value={solid.shift?.[i] ?? 0}
          parse={parsePlace(unit)}
          format={(mm) => formatLength(mm, unit)}
          step={stepOf(unit)}
          fault={faultAt(`/shift/${i}`) ?? (i === 0 ? faultAt('/shift') : undefined)}
          onValue={(mm) =>
            dispatch({
              type: 'edit',
              name: `shift ${axis} of ${solid.id}`,
              edit: (now) => setTaperShift(now, solid.id, i as 0 | 1, mm),
            })
          }
        />
      ))}
      <p className="label max-w-36 self-end">of the top’s middle from the bottom’s</p>
    </div>
  );
}
