import { useId, type Dispatch } from 'react';
import type { Box } from '~/domain/tank/kinds/box/schema';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { setEdgeRadius } from '~/scene/box-edges';
import type { SceneAction } from '~/scene/scene';
import { parseHeight } from './parse-typed';
import type { FaultAt } from './part-faults';
import { stepOf } from './step-of';
import { TypedNumber } from './TypedNumber';

interface EdgeFieldsProps {
  solid: Box;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  faultAt: FaultAt;
}

/** Radii of a box's edges: the four along x, along y, along z. Left empty they are sharp. */
export function EdgeFields({ solid, dispatch, unit, faultAt }: EdgeFieldsProps) {
  const id = useId();
  const fault = faultAt('/edges');
  const edit = (axis: 'x' | 'y' | 'z', radiusMm: number) =>
    dispatch({
      type: 'edit',
      name: `edges along ${axis} of ${solid.id}`,
      edit: (now) => setEdgeRadius(now, solid.id, axis, radiusMm),
    });
  return (
    <fieldset className="min-w-0" aria-describedby={fault ? `${id}-fault` : undefined}>
      <legend className="sr-only">Radius of the edges of {solid.id}</legend>
      <div className="flex flex-wrap items-start gap-x-3 gap-y-2">
        {(['x', 'y', 'z'] as const).map((axis) => (
          <TypedNumber
            key={axis}
            label={axis === 'x' ? 'edges along x' : `along ${axis}`}
            value={solid.edges?.[axis] || null}
            placeholder="sharp"
            parse={parseHeight(unit)}
            format={(mm) => formatLength(mm, unit)}
            step={stepOf(unit)}
            fault={faultAt(`/edges/${axis}`)}
            onValue={(radiusMm) => edit(axis, radiusMm)}
            onEmpty={() => edit(axis, 0)}
          />
        ))}
      </div>
      {fault && (
        <p id={`${id}-fault`} className="fault max-w-80" role="alert">
          {fault}
        </p>
      )}
    </fieldset>
  );
}
