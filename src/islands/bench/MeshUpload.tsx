import { useId, useState, type Dispatch, type FormEvent } from 'react';
import type { TankDocument } from '~/domain/tank/document';
import { mesh } from '~/domain/tank/kinds/mesh/mesh';
import { meshUnits, type MeshUnit, type UploadedMesh } from '~/domain/tank/kinds/mesh/uploaded';
import { addSolid, freeId } from '~/scene/commands';
import type { SceneAction } from '~/scene/scene';
import { uploadMesh } from '../shared/api';
import { ApiProblem } from '../shared/problem';

const mostBytes = 64 * 1024 * 1024;
const unitWords: Record<MeshUnit, string> = {
  mm: 'millimetre',
  cm: 'centimetre',
  m: 'metre',
  in: 'inch',
};

interface MeshUploadProps {
  document: TankDocument;
  dispatch: Dispatch<SceneAction>;
  onClose(): void;
}

/** A solid from an STL or OBJ file: the file, its unit, what is wrong with it; then the solid stands in the tank. */
export function MeshUpload({ document, dispatch, onClose }: MeshUploadProps) {
  const [file, setFile] = useState<File | null>(null);
  const [unit, setUnit] = useState<MeshUnit | null>(null);
  const [sent, setSent] = useState<number | null>(null);
  const [faults, setFaults] = useState<readonly string[]>([]);
  const [taken, setTaken] = useState<UploadedMesh | null>(null);
  const id = useId();

  async function submit(event: FormEvent) {
    event.preventDefault();
    const missing = [
      ...(file ? [] : ['Choose an STL or OBJ file.']),
      ...(file && file.size > mostBytes
        ? ['The file is larger than 64 MB, the most that is taken: write a coarser mesh.']
        : []),
      ...(unit ? [] : ['Choose the unit that the file was drawn in: STL and OBJ do not say it.']),
    ];
    setFaults(missing);
    if (missing.length > 0 || !file || !unit) return;
    setSent(0);
    try {
      const answer = await uploadMesh(file, unit, setSent);
      const solidId = freeId(document, mesh.label);
      dispatch({
        type: 'edit',
        name: `add ${solidId}`,
        select: solidId,
        edit: (now) =>
          addSolid(now, { ...mesh.blank(solidId), upload: answer.id, scale: answer.scale }),
      });
      if (answer.notes.length === 0) onClose();
      else setTaken(answer);
    } catch (error) {
      if (!(error instanceof ApiProblem)) throw error;
      setFaults(
        error.faults.length > 0 ? error.faults.map(({ detail }) => detail) : [error.message],
      );
    } finally {
      setSent(null);
    }
  }

  if (taken) {
    return (
      <div role="status" className="border-y border-hair bg-film px-3 py-3">
        <p>The mesh is in the tank.</p>
        <ul className="list-disc pl-5">
          {taken.notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
        <button type="button" className="act-text pt-2" onClick={onClose}>
          Close
        </button>
      </div>
    );
  }
  return (
    <form
      noValidate
      onSubmit={(event) => void submit(event)}
      aria-label="Add a mesh"
      className="grid max-w-xl gap-4 border-y border-hair bg-film px-3 py-3"
    >
      {faults.length > 0 && (
        <ul role="alert" className="fault grid gap-1">
          {faults.map((fault) => (
            <li key={fault}>{fault}</li>
          ))}
        </ul>
      )}
      <div className="grid gap-1">
        <label htmlFor={`${id}-file`} className="label">
          Closed mesh, STL or OBJ, at most 64 MB and a million triangles
        </label>
        <input
          id={`${id}-file`}
          type="file"
          accept=".stl,.obj"
          className="max-w-full"
          onChange={({ target }) => setFile(target.files?.[0] ?? null)}
        />
      </div>
      <fieldset>
        <legend className="label">One unit of the file is a</legend>
        <div className="flex flex-wrap gap-x-5 gap-y-1 pt-1">
          {(Object.keys(meshUnits) as MeshUnit[]).map((one) => (
            <label key={one} className="flex items-center gap-2">
              <input
                type="radio"
                name={`${id}-unit`}
                checked={unit === one}
                onChange={() => setUnit(one)}
              />
              {unitWords[one]}
            </label>
          ))}
        </div>
      </fieldset>
      {sent !== null && (
        <p role="status" className="flex items-center gap-3">
          <progress max={1} value={sent} aria-label="Sent" />
          {sent < 1 ? `${Math.round(100 * sent)} % sent` : 'Looking for holes and turned faces…'}
        </p>
      )}
      <div className="flex gap-5">
        <button className="act" disabled={sent !== null}>
          {sent === null ? 'Add the mesh' : 'Adding…'}
        </button>
        <button type="button" className="act-text" onClick={onClose} disabled={sent !== null}>
          Cancel
        </button>
      </div>
    </form>
  );
}
