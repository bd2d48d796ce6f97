import { axisOrder, type Shape, type Vec2 } from './shape';
import type { Bounds } from './shape-bounds';

type Revolution = Extract<Shape, { form: 'revolution' }>;

/** A turned shape cut square to its axis where nothing else comes near, and what was cut off. */
export interface FarCaps {
  /** What is left, with flat ends where caps were. */
  rest: Revolution;
  /** Open profiles of the caps, axis and rim both in them, in the order of the whole profile. */
  caps: readonly (readonly Vec2[])[];
}

/** A cap nearer than this to another solid stays where it is. mm */
const clearMm = 0.01;

/** Fewer rings than this are not worth a cut. */
const leastRings = 4;

/**
 * Formed ends and the like that stand clear of all other solids, cut off: joining and cutting then has a flat end
 * to deal with instead of thousands of facets. null when there is none.
 *
 * @param others bounds of the other solids in this one's own frame
 */
export function farCaps(shape: Revolution, own: Bounds, others: readonly Bounds[]): FarCaps | null {
  const { profile, stretch } = shape;
  const axis = axisOrder(shape.axis)[2];
  const last = profile.length - 1;
  if (profile[0]![0] !== 0 || profile[last]![0] !== 0) return null;
  const near = others.filter((other) => meets(own, other));
  const from = Math.min(...near.map(({ low }) => low[axis])) - clearMm;
  const to = Math.max(...near.map(({ high }) => high[axis])) + clearMm;
  const place = (i: number) => profile[i]![1] * stretch[axis];

  // the profile runs from the low end to the high one; a cap holds all of it that lies beyond the cut
  let low = 0;
  while (low < last && place(low + 1) > place(low) && place(low + 1) < from) low += 1;
  let high = last;
  while (high > 0 && place(high - 1) < place(high) && place(high - 1) > to) high -= 1;
  for (let i = low + 1; i <= last; i += 1) if (place(i) < place(low)) low = 0;
  for (let i = 0; i < high; i += 1) if (place(i) > place(high)) high = last;
  if (low < leastRings) low = 0;
  if (last - high < leastRings) high = last;
  // a solid that meets nothing keeps its widest part
  if (low >= high) return null;
  if (low === 0 && high === last) return null;

  const middle = profile.slice(low, high + 1);
  const flat = (i: number): Vec2[] => (profile[i]![0] === 0 ? [] : [[0, profile[i]![1]]]);
  return {
    rest: { ...shape, profile: [...flat(low), ...middle, ...flat(high)] },
    caps: [
      ...(low > 0 ? [profile.slice(0, low + 1)] : []),
      ...(high < last ? [profile.slice(high)] : []),
    ],
  };
}

function meets(one: Bounds, other: Bounds): boolean {
  return [0, 1, 2].every(
    (axis) =>
      one.low[axis]! <= other.high[axis]! + clearMm &&
      other.low[axis]! <= one.high[axis]! + clearMm,
  );
}
