/**
 * Undo and redo as plain data: every step keeps the state before it and its name.
 * One gesture is one step: steps that carry the same `gesture` in a row melt into one.
 */
export interface History<State> {
  past: readonly Step<State>[];
  present: State;
  future: readonly Step<State>[];
}

export interface Step<State> {
  state: State;
  /** What was done, as said beside Undo: "size of ramp". */
  name: string;
  gesture: string | null;
}

export function newHistory<State>(present: State): History<State> {
  return { past: [], present, future: [] };
}

export function record<State>(
  history: History<State>,
  state: State,
  name: string,
  gesture: string | null = null,
): History<State> {
  if (state === history.present) return history;
  const last = history.past[history.past.length - 1];
  const sameGesture = gesture !== null && last?.gesture === gesture && history.future.length === 0;
  return {
    past: sameGesture ? history.past : [...history.past, { state: history.present, name, gesture }],
    present: state,
    future: [],
  };
}

export function undo<State>(history: History<State>): History<State> {
  const step = history.past[history.past.length - 1];
  if (!step) return history;
  return {
    past: history.past.slice(0, -1),
    present: step.state,
    future: [{ ...step, state: history.present }, ...history.future],
  };
}

export function redo<State>(history: History<State>): History<State> {
  const step = history.future[0];
  if (!step) return history;
  return {
    past: [...history.past, { ...step, state: history.present, gesture: null }],
    present: step.state,
    future: history.future.slice(1),
  };
}
