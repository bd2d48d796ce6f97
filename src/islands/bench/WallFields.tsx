import { useId, useState, type Dispatch } from 'react';
import type { TankDocument } from '~/domain/tank/document';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { setWall } from '~/scene/commands';
import type { SceneAction } from '~/scene/scene';
import { parseSize } from './parse-typed';
import { TypedNumber } from './TypedNumber';

interface WallFieldsProps {
  document: TankDocument;
  dispatch: Dispatch<SceneAction>;
  length: LengthUnit;
  /** What the engine says of the wall. */
  fault: string | undefined;
}

/**
 * Asks whether sizes are inside or outside ones, and how thick the wall is that comes off outside ones. Nothing is
 * written before it is answered, and no thickness is made up.
 */
export function WallFields({ document, dispatch, length, fault }: WallFieldsProps) {
  const { wall } = document;
  const id = useId();
  // outside was chosen, its thickness not typed yet
  const [asked, setAsked] = useState(false);
  const chosen = asked ? 'outside' : (wall?.sizes ?? '');
  const edit = (name: string, next: TankDocument['wall']) =>
    dispatch({ type: 'edit', name, edit: (now) => setWall(now, next) });

  const choose = (sizes: string) => {
    setAsked(false);
    if (sizes === '') edit('inside or outside', undefined);
    if (sizes === 'inside') edit('inside sizes', { ...wall, sizes: 'inside' });
    if (sizes !== 'outside') return;
    const thickness = wall?.thickness;
    if (thickness === undefined) setAsked(true);
    else edit('outside sizes', { thickness, sizes: 'outside' });
  };

  return (
    <div className="flex flex-wrap gap-x-4">
      <div className="min-w-32 flex-1">
        <label htmlFor={id} className="label">
          Sizes are
        </label>
        <select
          id={id}
          className="typed min-h-8 py-0.5 font-semibold"
          value={chosen}
          onChange={(event) => choose(event.target.value)}
        >
          <option value="">inside or outside?</option>
          <option value="inside">inside</option>
          <option value="outside">outside, less the wall</option>
        </select>
      </div>
      {chosen === 'outside' && (
        <TypedNumber
          label="wall"
          unit={length}
          value={asked ? null : (wall?.thickness ?? null)}
          placeholder="how thick?"
          parse={parseSize(length)}
          format={(mm) => formatLength(mm, length)}
          fault={fault}
          onValue={(thickness) => {
            setAsked(false);
            edit('wall', { thickness, sizes: 'outside' });
          }}
        />
      )}
      {(chosen === '' || asked) && (
        <p className="w-full">
          {asked
            ? 'Type the wall: until then sizes count as inside.'
            : 'Not told: sizes count as inside.'}
        </p>
      )}
    </div>
  );
}
