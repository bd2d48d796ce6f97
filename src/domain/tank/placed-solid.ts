import type { Interval } from '../../geometry/intervals';
import type { Line } from '../../geometry/line';
import type { PlacedShape } from '../../geometry/placed-shape';
import { directionToOwn, placing, toOwn, type Placing } from '../../geometry/placing';
import { dot } from '../../geometry/vec3';
import type { Kind } from './kinds/kind';
import { kindOf, type Solid } from './kinds/registry';
import type { Vec3 } from './solid';

/** A solid of the document with its kind and where it stands in the tank's frame. */
export interface PlacedSolid {
  solid: Solid;
  kind: Kind<Solid>;
  place: Placing;
  /** The solid as drawn, where this is what is left of it inside the wall. */
  drawn?: PlacedSolid;
}

export function placedSolid(solid: Solid): PlacedSolid {
  const kind = kindOf(solid);
  const place = placing(solid.at ?? [0, 0, 0], kind.extent(solid), solid.turn ?? [0, 0, 0]);
  return { solid, kind, place };
}

/** How its mesh is made, `facets` chords to a full turn. */
export function placedShape({ solid, kind, place }: PlacedSolid, facets: number): PlacedShape {
  const tank = { x: directionToOwn(place, [1, 0, 0]), z: directionToOwn(place, [0, 0, 1]) };
  return { shape: kind.shape(solid, facets, tank), place };
}

/** Highest level u·p of the solid in the tank's frame, mm, closed form; `up` a unit vector. */
export function highestLevel({ solid, kind, place }: PlacedSolid, up: Vec3): number {
  return dot(up, place.centre) + kind.support(solid, directionToOwn(place, up));
}

/** Stretches of a line of the tank's frame inside the solid, closed form; see Kind.chords. */
export function chordsOf(
  { solid, kind, place }: PlacedSolid,
  line: Line,
  slack: number,
): readonly Interval[] {
  const own = {
    origin: toOwn(place, line.origin),
    direction: directionToOwn(place, line.direction),
  };
  return kind.chords(solid, own, slack);
}
