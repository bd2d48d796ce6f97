import type { Mesh } from './mesh';
import type { Vec3 } from './vec3';

export type Axis = 'x' | 'y' | 'z';

/** A point of a flat outline, mm. */
export type Vec2 = readonly [number, number];

/**
 * How a solid's mesh is made, as plain numbers in its own frame (its upright box centred on the
 * origin, mm). An axis takes the outline's two directions in turn: x → (y, z), y → (z, x), z → (x, y).
 */
export type Shape =
  | {
      form: 'extrusion';
      axis: Axis;
      /** Once round against the clock, seen against the axis; must not cross itself. */
      outline: readonly Vec2[];
      /** From −length/2 to +length/2 along the axis. */
      length: number;
      /** By side (from a point to the next): whether it is flat in truth, no chord of something round. None when left out. */
      flat?: readonly boolean[];
    }
  | {
      form: 'revolution';
      axis: Axis;
      /** (radius, place along the axis), once round against the clock; radius 0 lies on the axis. */
      profile: readonly Vec2[];
      facets: number;
      /** Direction of the first meridian in the outline's plane, radians. */
      phase: number;
      /** Stretch along own x, y, z after turning; 1, 1, 1 for a body of revolution. */
      stretch: Vec3;
    }
  | {
      form: 'mesh';
      /** Closed, outward, in the own frame; vertices that are one place are one vertex. */
      mesh: Mesh;
      /** Planes normal·p = offset (unit normals) of faces that are flat in truth, beside others that are round. */
      flat?: readonly { normal: Vec3; offset: number }[];
    };

/** Index of one of the axes x, y, z. */
type Index = 0 | 1 | 2;

const order: Record<Axis, readonly [Index, Index, Index]> = {
  x: [1, 2, 0],
  y: [2, 0, 1],
  z: [0, 1, 2],
};

/** Index of the own axis that the outline's first, second and the extrusion's direction lie along. */
export function axisOrder(axis: Axis): readonly [Index, Index, Index] {
  return order[axis];
}
