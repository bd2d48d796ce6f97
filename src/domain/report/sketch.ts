import type { Preview, ReadingFrame, TankMesh } from '../table/preview';
import type { StickNotice } from '../table/stick-notice';
import { elevation, type Elevation, type View } from './elevation';

/** An elevation of the tank with its stick, mm: x to the right, y up, origin at the lower left. */
export interface Sketch {
  view: View;
  widthMm: number;
  heightMm: number;
  /** Edges: seen ones, and those behind something. */
  lines: readonly { x1: number; y1: number; x2: number; y2: number; hidden: boolean }[];
  /** Where the stick stands: from its zero to the roof; null when none was set. */
  stick: { x: number; zeroY: number; roofY: number } | null;
  /** Dip point in words, measured from what the sketch shows; null without a stick. */
  dipPoint: { fromLeftMm: number; fromNearMm: number; zeroAboveLowestMm: number } | null;
  /** What a dip there does not tell. */
  stickNotices: readonly StickNotice[];
}

/**
 * The sketch of a tank from its mesh: of the two elevations (from the side, along y; from the end,
 * along −x) the one that says more, which is the one that fills less of its frame.
 * Drawn in the tank's own frame, as if level. `extent`: the space's true overall sizes; left out, those of the mesh.
 */
export function sketchOf(
  space: TankMesh,
  frame: ReadingFrame,
  stickNotices: readonly StickNotice[] = [],
  extent: Preview['extent'] | null = null,
): Sketch {
  const side = elevation(space, 'side');
  const end = elevation(space, 'end');
  const chosen = end.filled < side.filled - 0.02 ? end : side;
  return { ...fromElevation(extent ? inExtent(chosen, extent) : chosen, frame), stickNotices };
}

/** Overall sizes as they are: the corners of a mesh stand a little outside a round surface. */
function inExtent(view: Elevation, { low, high }: Preview['extent']): Elevation {
  const across = view.view === 'side' ? 0 : 1;
  return { ...view, minX: low[across], maxX: high[across], minY: low[2], maxY: high[2] };
}

function fromElevation(view: Elevation, frame: ReadingFrame): Omit<Sketch, 'stickNotices'> {
  const { minX, minY, lines } = view;
  const { stick } = frame;
  const across = stick === null ? 0 : view.view === 'side' ? stick.at[0] : stick.at[1];
  return {
    view: view.view,
    widthMm: view.maxX - minX,
    heightMm: view.maxY - minY,
    lines: lines.map(({ x1, y1, x2, y2, hidden }) => ({
      x1: x1 - minX,
      y1: y1 - minY,
      x2: x2 - minX,
      y2: y2 - minY,
      hidden,
    })),
    stick:
      stick === null
        ? null
        : { x: across - minX, zeroY: stick.zeroZ - minY, roofY: stick.roofZ - minY },
    dipPoint:
      stick === null
        ? null
        : {
            fromLeftMm: across - minX,
            fromNearMm:
              view.view === 'side' ? stick.at[1] - view.nearest : view.nearest - stick.at[0],
            zeroAboveLowestMm: stick.zeroZ - minY,
          },
  };
}
