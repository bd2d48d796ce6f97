import type { Dispatch, ReactNode } from 'react';
import { createPortal } from 'react-dom';
import type { TankDocument } from '~/domain/tank/document';
import type { History } from '~/scene/history';
import type { SceneAction } from '~/scene/scene';
import type { Saving } from './use-draft-saving';

interface TopLineProps {
  history: History<TankDocument>;
  dispatch: Dispatch<SceneAction>;
  saving: Saving;
  settingsUnsaved: string | null;
  revisionWords: string;
  children: ReactNode;
}

/** State of the draft, undo and redo, print and issue: shown in the page's own top bar. */
export function TopLine(props: TopLineProps) {
  const { history, dispatch, saving, settingsUnsaved, revisionWords, children } = props;
  const slot = document.getElementById('bench-actions');
  const undoable = history.past[history.past.length - 1];
  const redoable = history.future[0];
  const line = (
    <>
      <p className="text-note text-ink-2" role="status">
        {revisionWords} ·{' '}
        {settingsUnsaved ? `settings not saved: ${settingsUnsaved}` : savedWords(saving)}
      </p>
      <div className="flex gap-3">
        <button
          type="button"
          className="act-text text-note"
          disabled={!undoable}
          aria-keyshortcuts="Control+Z Meta+Z"
          title={undoable ? `Undo ${undoable.name} (Ctrl Z)` : 'Nothing to undo'}
          onClick={() => dispatch({ type: 'undo' })}
        >
          Undo
        </button>
        <button
          type="button"
          className="act-text text-note"
          disabled={!redoable}
          aria-keyshortcuts="Control+Shift+Z Meta+Shift+Z"
          title={redoable ? `Redo ${redoable.name} (Ctrl Shift Z)` : 'Nothing to redo'}
          onClick={() => dispatch({ type: 'redo' })}
        >
          Redo
        </button>
      </div>
      {children}
    </>
  );
  return slot ? (
    createPortal(line, slot)
  ) : (
    <div className="flex flex-wrap gap-4 px-4 py-2">{line}</div>
  );
}

function savedWords(saving: Saving): string {
  switch (saving.state) {
    case 'saved':
      return saving.at ? `saved ${clock(saving.at)}` : 'saved';
    case 'changed':
    case 'saving':
      return 'saving …';
    case 'unsaved':
      return `not saved: ${saving.why}`;
    case 'conflict':
      return 'not saved: somebody saved first';
  }
}

function clock(at: Date): string {
  return at.toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });
}
