import { useEffect, useRef } from 'react';
import type { TankDocument } from '~/domain/tank/document';
import type { Saving } from './use-draft-saving';

interface ConflictProps {
  conflict: Extract<Saving, { state: 'conflict' }>;
  mine: TankDocument;
  onTakeTheirs(): void;
  onKeepMine(): void;
}

/** Two people on one tank: the second save is told who changed what and offered both. */
export function Conflict({ conflict, mine, onTakeTheirs, onKeepMine }: ConflictProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    heading.current?.focus();
    // what was chosen goes away with its button: undo is what may be wanted next
    return () => void setTimeout(focusUndo);
  }, []);
  const at = new Date(conflict.at).toLocaleTimeString('en-GB', {
    hour: '2-digit',
    minute: '2-digit',
  });
  const differences = differencesOf(mine, conflict.theirs);
  return (
    <section className="border-b border-ink bg-sheet px-4 py-4 sm:px-6" aria-labelledby="conflict">
      <h2 id="conflict" ref={heading} tabIndex={-1} className="outline-none">
        {conflict.by} saved this tank at {at}, before you
      </h2>
      <p>Your changes are still here and are not saved yet. The two drafts differ in:</p>
      <ul className="my-2 list-disc pl-5">
        {differences.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
      <p className="flex flex-wrap gap-3">
        <button type="button" className="act" onClick={onKeepMine}>
          Save mine over it
        </button>
        <button type="button" className="act-plain" onClick={onTakeTheirs}>
          Take theirs (undo brings mine back)
        </button>
      </p>
    </section>
  );
}

function focusUndo(): void {
  document.getElementById('bench-actions')?.querySelector('button')?.focus();
}

/** The solids and settings in which two drafts differ, one plain line each. */
export function differencesOf(mine: TankDocument, theirs: TankDocument): string[] {
  const lines: string[] = [];
  const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);
  for (const solid of mine.solids) {
    const other = theirs.solids.find((one) => one.id === solid.id);
    if (!other) lines.push(`${solid.id}: only in yours`);
    else if (!same(solid, other)) lines.push(`${solid.id}: sizes, place or turn`);
  }
  for (const solid of theirs.solids) {
    if (!mine.solids.some((one) => one.id === solid.id)) lines.push(`${solid.id}: only in theirs`);
  }
  if (!same(mine.stick, theirs.stick)) lines.push('the stick');
  if (!same(mine.attitude, theirs.attitude)) lines.push('how it stands');
  if (!same(mine.wall, theirs.wall)) lines.push('the wall');
  if (!same(mine.outlet, theirs.outlet) || !same(mine.vent, theirs.vent))
    lines.push('outlet or vent');
  return lines.length > 0 ? lines : ['nothing that shows: the order of the solids'];
}
