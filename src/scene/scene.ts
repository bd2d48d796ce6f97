import type { TankDocument } from '~/domain/tank/document';
import { newHistory, record, redo, undo, type History } from './history';

/** The tank being edited: its document with history, and what is chosen. No React, no three. */
export interface Scene {
  history: History<TankDocument>;
  /** Id of the solid whose sizes are open in the parts list. */
  selected: string | null;
}

export type SceneAction =
  | {
      type: 'edit';
      /** What was done, for Undo: "size of ramp". */
      name: string;
      /** Steps of one gesture melt into one. */
      gesture?: string;
      select?: string | null;
      edit(document: TankDocument): TankDocument;
    }
  | { type: 'select'; id: string | null }
  | { type: 'undo' }
  | { type: 'redo' }
  /** Takes over another document as one undoable step (after a conflict, or a starting point). */
  | { type: 'replace'; name: string; document: TankDocument };

export function newScene(document: TankDocument): Scene {
  return {
    history: newHistory(document),
    selected: document.solids[0]?.id ?? null,
  };
}

export function sceneReducer(scene: Scene, action: SceneAction): Scene {
  switch (action.type) {
    case 'edit': {
      const document = action.edit(scene.history.present);
      const history = record(scene.history, document, action.name, action.gesture ?? null);
      return keepSelection({
        history,
        selected: action.select === undefined ? scene.selected : action.select,
      });
    }
    case 'select':
      return scene.selected === action.id ? scene : { ...scene, selected: action.id };
    case 'undo':
      return keepSelection({ ...scene, history: undo(scene.history) });
    case 'redo':
      return keepSelection({ ...scene, history: redo(scene.history) });
    case 'replace':
      return keepSelection({
        ...scene,
        history: record(scene.history, action.document, action.name),
      });
  }
}

function keepSelection(scene: Scene): Scene {
  const exists = scene.history.present.solids.some((solid) => solid.id === scene.selected);
  return exists || scene.selected === null ? scene : { ...scene, selected: null };
}
