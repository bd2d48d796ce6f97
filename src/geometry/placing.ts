import { snap } from './tolerance';
import type { Vec3 } from './vec3';

/**
 * Where a solid stands: own frame (its upright box centred on the origin) → tank frame,
 * p = centre + R·own, with R = Rz·Ry·Rx (about x first, then y, then z, fixed axes).
 */
export interface Placing {
  centre: Vec3;
  /** Rows of R. */
  rows: readonly [Vec3, Vec3, Vec3];
  /** R only swaps and flips axes, so that flat faces stay on the snapping grid. */
  aligned: boolean;
}

/**
 * @param at lowest corner of the box before it is turned, mm
 * @param extent lengths of the box along x, y, z, mm
 * @param turn degrees about x, y, z; right angles are exact
 */
export function placing(at: Vec3, extent: Vec3, turn: Vec3): Placing {
  const [cx, sx] = cosSin(turn[0]);
  const [cy, sy] = cosSin(turn[1]);
  const [cz, sz] = cosSin(turn[2]);
  const rows: Placing['rows'] = [
    [cz * cy, cz * sy * sx - sz * cx, cz * sy * cx + sz * sx],
    [sz * cy, sz * sy * sx + cz * cx, sz * sy * cx - cz * sx],
    [-sy, cy * sx, cy * cx],
  ];
  return {
    centre: [at[0] + extent[0] / 2, at[1] + extent[1] / 2, at[2] + extent[2] / 2],
    rows,
    aligned: rows.every((row) => row.every((value) => Number.isInteger(value))),
  };
}

/** A point of the own frame in the tank's frame; snapped to the grid when the solid is aligned. */
export function toTank(place: Placing, own: Vec3): Vec3 {
  const [rx, ry, rz] = place.rows;
  const x = place.centre[0] + rx[0] * own[0] + rx[1] * own[1] + rx[2] * own[2];
  const y = place.centre[1] + ry[0] * own[0] + ry[1] * own[1] + ry[2] * own[2];
  const z = place.centre[2] + rz[0] * own[0] + rz[1] * own[1] + rz[2] * own[2];
  return place.aligned ? [snap(x), snap(y), snap(z)] : [x, y, z];
}

/** A point of the tank's frame in the own frame. */
export function toOwn(place: Placing, point: Vec3): Vec3 {
  return directionToOwn(place, [
    point[0] - place.centre[0],
    point[1] - place.centre[1],
    point[2] - place.centre[2],
  ]);
}

/** A direction of the tank's frame in the own frame (Rᵀ). */
export function directionToOwn(place: Placing, direction: Vec3): Vec3 {
  const [rx, ry, rz] = place.rows;
  const [x, y, z] = direction;
  return [
    rx[0] * x + ry[0] * y + rz[0] * z,
    rx[1] * x + ry[1] * y + rz[1] * z,
    rx[2] * x + ry[2] * y + rz[2] * z,
  ];
}

function cosSin(degrees: number): readonly [number, number] {
  const quarter = degrees / 90;
  if (Number.isInteger(quarter)) {
    const exact = [
      [1, 0],
      [0, 1],
      [-1, 0],
      [0, -1],
    ] as const;
    return exact[((quarter % 4) + 4) % 4]!;
  }
  const radians = (degrees * Math.PI) / 180;
  return [Math.cos(radians), Math.sin(radians)];
}
