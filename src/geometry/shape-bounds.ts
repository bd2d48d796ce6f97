import { areaPreservingFactor } from './circle';
import { axisOrder, type Shape } from './shape';
import type { Vec3 } from './vec3';

/** An upright box of some frame, mm. */
export interface Bounds {
  low: Vec3;
  high: Vec3;
}

/** The least upright box of the own frame that holds a shape's mesh. */
export function shapeBounds(shape: Shape): Bounds {
  if (shape.form === 'mesh') return boundsOf(shape.mesh.positions);
  const [first, second, third] = axisOrder(shape.axis);
  const low: [number, number, number] = [0, 0, 0];
  const high: [number, number, number] = [0, 0, 0];
  const set = (axis: number, from: number, to: number) => {
    low[axis] = from;
    high[axis] = to;
  };
  if (shape.form === 'extrusion') {
    set(first, least(shape.outline.map(([a]) => a)), greatest(shape.outline.map(([a]) => a)));
    set(second, least(shape.outline.map(([, b]) => b)), greatest(shape.outline.map(([, b]) => b)));
    set(third, -shape.length / 2, shape.length / 2);
    return { low, high };
  }
  const reach = greatest(shape.profile.map(([r]) => r)) * areaPreservingFactor(shape.facets);
  const places = shape.profile.map(([, place]) => place);
  set(first, -reach * shape.stretch[first], reach * shape.stretch[first]);
  set(second, -reach * shape.stretch[second], reach * shape.stretch[second]);
  set(third, least(places) * shape.stretch[third], greatest(places) * shape.stretch[third]);
  return { low, high };
}

/** The eight corners of a box. */
export function cornersOf({ low, high }: Bounds): Vec3[] {
  return [0, 1, 2, 3, 4, 5, 6, 7].map((bits) => [
    bits & 1 ? high[0] : low[0],
    bits & 2 ? high[1] : low[1],
    bits & 4 ? high[2] : low[2],
  ]);
}

/** The least upright box round points x, y, z, x, … */
export function boundsOf(positions: ArrayLike<number>): Bounds {
  const low: [number, number, number] = [Infinity, Infinity, Infinity];
  const high: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  for (let i = 0; i < positions.length; i += 1) {
    const axis = i % 3;
    const value = positions[i]!;
    if (value < low[axis]!) low[axis] = value;
    if (value > high[axis]!) high[axis] = value;
  }
  return { low, high };
}

function least(values: readonly number[]): number {
  return values.reduce((one, other) => Math.min(one, other), Infinity);
}

function greatest(values: readonly number[]): number {
  return values.reduce((one, other) => Math.max(one, other), -Infinity);
}
