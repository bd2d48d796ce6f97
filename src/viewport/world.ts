import { Plane, Vector3 } from 'three';
import type { Vec3 } from '~/domain/tank/solid';
import { apply, type Plate, type Projection } from './projection';

/** A point of the tank (mm, its own frame) in three's world: px, y up, origin in the middle. */
export type ToWorld = (p: Vec3) => Vec3;

/** Plate px (y down) → world px (y up). */
export function worldOf(projection: Projection, plate: Plate): ToWorld {
  const { linear, offset } = projection;
  return (p) => {
    const [x, y, z] = apply(linear, p);
    return [x + offset[0] - plate.width / 2, plate.height / 2 - (y + offset[1]), z + offset[2]];
  };
}

export function worldPoints(points: ArrayLike<number>, toWorld: ToWorld): Float32Array {
  const world = new Float32Array(points.length);
  for (let i = 0; i < points.length; i += 3) {
    world.set(toWorld([points[i]!, points[i + 1]!, points[i + 2]!]), i);
  }
  return world;
}

/** The level as a clipping plane of the world: what lies on the kept side has a positive distance. */
export function levelPlane(
  up: Vec3,
  level: number,
  keep: 'below' | 'above',
  toWorld: ToWorld,
): Plane {
  const [x, y, z] = up;
  const helper: Vec3 = Math.abs(z) > 0.5 ? [1, 0, 0] : [0, 0, 1];
  const along = cross(up, helper);
  const across = cross(up, along);
  const at = (a: Vec3 | null): Vector3 => {
    const size = 1000;
    const p: Vec3 = [
      x * level + (a ? a[0] * size : 0),
      y * level + (a ? a[1] * size : 0),
      z * level + (a ? a[2] * size : 0),
    ];
    return new Vector3(...toWorld(p));
  };
  const plane = new Plane().setFromCoplanarPoints(at(null), at(along), at(across));
  const above = new Vector3(
    ...toWorld([x * (level + 1000), y * (level + 1000), z * (level + 1000)]),
  );
  const positiveIsAbove = plane.distanceToPoint(above) > 0;
  return positiveIsAbove === (keep === 'above') ? plane : plane.negate();
}

function cross(a: Vec3, b: Vec3): Vec3 {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}
