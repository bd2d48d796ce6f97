import type { Dispatch } from 'react';
import type { Size } from '~/domain/tank/kinds/kind';
import type { Solid } from '~/domain/tank/kinds/registry';
import { valueAt } from '~/domain/tank/value-at';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { setSize } from '~/scene/commands';
import type { SceneAction } from '~/scene/scene';
import { parseHeight, parsePlace, parseSize } from './parse-typed';
import type { FaultAt } from './part-faults';
import { stepOf } from './step-of';
import { TypedNumber } from './TypedNumber';

interface SizeFieldProps {
  solid: Solid;
  size: Size;
  /** What the field is called here, where it is not what the size is called in a list. */
  label?: string;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  faultAt: FaultAt;
}

/** One size of a solid, typed. A size that the document does not have yet is 0. */
export function SizeField({ solid, size, label, dispatch, unit, faultAt }: SizeFieldProps) {
  return (
    <TypedNumber
      label={label ?? size.label}
      value={Number(valueAt(solid, size.path) ?? 0)}
      parse={parserOf(size, unit)}
      format={(mm) => formatLength(mm, unit)}
      step={stepOf(unit)}
      fault={faultAt(`/${size.path.join('/')}`)}
      onValue={(value) =>
        dispatch({
          type: 'edit',
          name: `${size.label} of ${solid.id}`,
          edit: (now) => setSize(now, solid.id, size.path, value),
        })
      }
    />
  );
}

/** What may be typed for a size: a length, one that may be 0, or a place of either sign. */
function parserOf({ coordinate, mayBeZero }: Size, unit: LengthUnit) {
  if (coordinate) return parsePlace(unit);
  return mayBeZero ? parseHeight(unit) : parseSize(unit);
}
