import type { Preview } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';
import { onPlate, type Projection, type View } from '~/viewport/projection';

/** One dimension of the drawing: a measured edge on the plate, and how far off its line stands. */
export interface Dimension {
  from: [number, number];
  to: [number, number];
  /** From the edge to the dimension line, px. */
  offset: [number, number];
  lengthMm: number;
}

type Axis = 0 | 1 | 2;
const off = 34;

/** The overall sizes of the liquid space, placed where a draughtsman would for this view. */
export function dimensionsOf(
  extent: Preview['extent'],
  view: View,
  projection: Projection,
): Dimension[] {
  if (view.name === 'free') return [];
  const { low, high } = extent;
  const edge = (axis: Axis, at: Vec3, offset: [number, number]): Dimension => {
    const from = [...at] as [number, number, number];
    const to = [...at] as [number, number, number];
    from[axis] = low[axis];
    to[axis] = high[axis];
    return {
      from: onPlate(projection, from),
      to: onPlate(projection, to),
      offset,
      lengthMm: high[axis] - low[axis],
    };
  };
  const [x0, y0, z0] = low;
  const [x1, , z1] = high;
  switch (view.name) {
    case 'side':
      return [edge(0, [x0, y0, z0], [0, off]), edge(2, [x0, y0, z0], [-off, 0])];
    case 'end':
      return [edge(1, [x1, y0, z0], [0, off]), edge(2, [x1, y0, z0], [-off, 0])];
    case 'plan':
      return [edge(0, [x0, y0, z1], [0, off]), edge(1, [x0, y0, z1], [-off, 0])];
    case 'away':
      return [
        edge(0, [x0, y0, z0], [0, off]),
        edge(2, [x0, y0, z0], [-off, 0]),
        edge(1, [x1, y0, z0], [14, 18]),
      ];
  }
}
