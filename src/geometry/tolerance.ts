/**
 * All lengths that geometry calls "nothing", mm, in one place. They are far below what a tape can
 * see and far above the rounding of double precision over the 200 m a document may span.
 */

/** Faces that lie parallel to the tank's axes are snapped to this grid, so that "touching" is exact. */
export const snapMm = 1e-6;

/** Two places nearer than this are the same place. */
export const samePlaceMm = 2e-6;

/** Liquid space or wall thinner than this cannot be built and may not be issued. */
export const thinMm = 0.01;

/** Part of the capacity below which a loose piece of mesh is rounding, not a chamber. */
export const dustOfCapacity = 1e-9;

/** Part of the capacity that double rounding and snapping may cost: no bound is stated below it. */
export const roundingOfCapacity = 1e-9;

/** The nearest place of the snapping grid. mm */
export function snap(mm: number): number {
  return Math.round(mm / snapMm) / 1e6;
}
