import { useState, type Dispatch } from 'react';
import type { FieldFault } from '~/domain/errors';
import type { TankDocument } from '~/domain/tank/document';
import { hasMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { kindOf, kinds, type Solid } from '~/domain/tank/kinds/registry';
import type { TankSettings } from '~/domain/tank/settings';
import type { TankChange } from '~/domain/tank/tank';
import { formatLength } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { addSolid, copySolid, freeId, removeSolid } from '~/scene/commands';
import type { SceneAction } from '~/scene/scene';
import { MeshUpload } from './MeshUpload';
import { sizesInTheList } from './sizes-in-the-list';
import { SolidFields } from './SolidFields';

interface PartsListProps {
  document: TankDocument;
  selected: string | null;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  settings: TankSettings;
  onSettings(change: TankChange): void;
  faults: readonly FieldFault[];
}

/** The parts list: every solid a row; the chosen one opens to be typed in. */
export function PartsList(props: PartsListProps) {
  const { document, selected, dispatch, unit, settings, onSettings, faults } = props;
  const [uploading, setUploading] = useState(false);
  return (
    <section aria-labelledby="parts">
      <h2 id="parts" className="sr-only">
        Parts list
      </h2>
      <div className="@container overflow-x-auto">
        <table className="drawn-table">
          <thead>
            <tr>
              <th className="sticky left-0 z-1 w-10 bg-sheet">
                <span className="sr-only">number</span>
              </th>
              <th>solid</th>
              <th>does</th>
              <th>kind</th>
              <th className="figure">sizes, {unit}</th>
              <th className="figure">at</th>
              <th className="figure">turned</th>
            </tr>
          </thead>
          <tbody>
            {document.solids.map((solid, index) => (
              <Rows
                key={index}
                solid={solid}
                number={index + 1}
                open={solid.id === selected}
                document={document}
                dispatch={dispatch}
                unit={unit}
                settings={settings}
                onSettings={onSettings}
                faults={faultsOf(faults, index, solid.id)}
              />
            ))}
          </tbody>
        </table>
      </div>
      <p className="flex flex-wrap gap-x-3 gap-y-1 py-2 pl-2 text-ink-2">
        Add:
        {kinds.map((kind) => (
          <button
            key={kind.kind}
            type="button"
            className="act-text"
            onClick={() => add(document, dispatch, kind)}
          >
            {kind.label}
          </button>
        ))}
        <button
          type="button"
          className="act-text"
          aria-expanded={uploading}
          onClick={() => setUploading(!uploading)}
        >
          mesh from a file
        </button>
      </p>
      {uploading && (
        <MeshUpload document={document} dispatch={dispatch} onClose={() => setUploading(false)} />
      )}
    </section>
  );
}

function Rows(props: {
  solid: Solid;
  number: number;
  open: boolean;
  document: TankDocument;
  dispatch: Dispatch<SceneAction>;
  unit: LengthUnit;
  settings: TankSettings;
  onSettings(change: TankChange): void;
  faults: readonly FieldFault[];
}) {
  const { solid, number, open, document, dispatch, unit, settings, onSettings, faults } = props;
  const kind = kindOf(solid);
  const at = solid.at ?? [0, 0, 0];
  const turn = solid.turn ?? [0, 0, 0];
  const sizes = sizesInTheList(solid, unit);
  const choose = () => dispatch({ type: 'select', id: open ? null : solid.id });
  return (
    <>
      <tr className={open ? 'bg-wash' : undefined}>
        <td className={`sticky left-0 z-1 ${open ? 'bg-wash' : 'bg-sheet'}`}>
          <span
            aria-hidden="true"
            className="grid size-6 place-items-center rounded-full border border-ink text-note font-semibold"
          >
            {number}
          </span>
        </td>
        <td className="whitespace-nowrap">
          <button
            type="button"
            className="act-text font-semibold"
            aria-expanded={open}
            aria-label={`${solid.id}: sizes, place and turn`}
            onClick={choose}
          >
            {solid.id}
          </button>
          {faults.length > 0 && !open && <span className="fault ml-2">see here</span>}
        </td>
        <td>{solid.role}</td>
        <td>{kind.label}</td>
        <td className={`figure ${sizes.length > 32 ? 'min-w-64' : 'whitespace-nowrap'}`}>
          {sizes}
        </td>
        <td className="figure whitespace-nowrap">
          {at.map((value) => formatLength(value, unit)).join(', ')}
        </td>
        <td className="figure whitespace-nowrap">{turn.map((value) => `${value}°`).join(', ')}</td>
      </tr>
      {open && (
        <tr>
          <td colSpan={7} className="bg-film">
            {/* as wide as what is seen of the table, and staying there when it is scrolled */}
            <div className="sticky left-[0.6rem] w-[calc(100cqw-1.2rem)]">
              <SolidFields
                solid={solid}
                document={document}
                dispatch={dispatch}
                unit={unit}
                settings={settings}
                onSettings={onSettings}
                faults={faults}
              />
              <p className="flex flex-wrap gap-x-4 pt-3">
                <button
                  type="button"
                  className="act-text"
                  onClick={() => copy(document, dispatch, solid)}
                >
                  Copy {solid.id}
                </button>
                <button
                  type="button"
                  className="act-text"
                  disabled={document.solids.length === 1}
                  onClick={() =>
                    dispatch({
                      type: 'edit',
                      name: `remove ${solid.id}`,
                      edit: (now) => removeSolid(now, solid.id),
                    })
                  }
                >
                  Remove {solid.id}
                </button>
                {document.solids.length === 1 && (
                  <span className="label">The last solid stays: a tank needs one.</span>
                )}
              </p>
            </div>
          </td>
        </tr>
      )}
    </>
  );
}

function add(
  document: TankDocument,
  dispatch: Dispatch<SceneAction>,
  kind: (typeof kinds)[number],
) {
  const id = freeId(document, kind.label);
  dispatch({
    type: 'edit',
    name: `add ${id}`,
    select: id,
    edit: (now) => addSolid(now, kind.blank(id)),
  });
}

function copy(document: TankDocument, dispatch: Dispatch<SceneAction>, solid: Solid) {
  const id = freeId(document, solid.id);
  // a mesh that is not here has no place of its own yet: the copy stands on it
  const there = solid.kind !== 'mesh' || hasMesh(solid.upload);
  const shift = there ? kindOf(solid).extent(solid)[0] : 0;
  dispatch({
    type: 'edit',
    name: `copy ${solid.id}`,
    select: id,
    edit: (now) => copySolid(now, solid.id, shift),
  });
}

/** Faults of one solid, to be said beside its fields: without the words that lead there. */
function faultsOf(faults: readonly FieldFault[], index: number, id: string): FieldFault[] {
  const start = `/solids/${index}`;
  return faults
    .filter(({ pointer }) => pointer === start || pointer.startsWith(`${start}/`))
    .map(({ pointer, detail }) => ({
      pointer: pointer.slice(start.length),
      detail: besideField(detail, `Solid "${id}"`),
    }));
}

/** `Solid "hull", profile, number 3: a radius …` → `A radius …` */
function besideField(detail: string, named: string): string {
  if (!detail.startsWith(named)) return detail;
  const [, sentence] = /^(?:, [^:]*)?: (.+)$/s.exec(detail.slice(named.length)) ?? [];
  return sentence ? sentence.charAt(0).toUpperCase() + sentence.slice(1) : detail;
}
