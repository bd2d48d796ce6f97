/** Whether the process still takes on work: asked by /readyz, set by the stop signal. */
export interface DrainState {
  leaving: boolean;
}
