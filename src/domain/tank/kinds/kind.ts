import type { z } from 'zod/v4';
import type { Interval } from '../../../geometry/intervals';
import type { Line } from '../../../geometry/line';
import type { Axis, Shape } from '../../../geometry/shape';
import type { SolidFields, Vec3 } from '../solid';

/** One size of a solid, as the parts list shows it and lets it be typed. */
export interface Size {
  /** Path inside the solid's entry of the document, e.g. `['length']`. */
  path: readonly string[];
  /** The trade's word for it: "length", "diameter". */
  label: string;
  unit: 'mm';
  /** A tip: 0 is a size of it too. */
  mayBeZero?: true;
  /** A place in the solid's own outline rather than a length: any number, also below 0. */
  coordinate?: true;
}

/** The tank's own directions as the solid sees them: unit vectors in the own frame. */
export interface TankDirections {
  x: Vec3;
  z: Vec3;
}

/**
 * A kind of solid: everything Dipwright knows about it, gathered in its folder and named once in
 * registry.ts. Lengths mm. "Own frame": the solid's upright box centred on the origin, not turned.
 */
export interface Kind<S extends SolidFields & { kind: string }> {
  kind: S['kind'];
  /** Word in the parts list and in the "add" line. */
  label: string;
  schema: z.ZodType<S>;
  /** Whether its mesh depends on the count of facets; `twice`: its triangles grow with the square of it. */
  curved(solid: S): false | 'once' | 'twice';
  /**
   * Where facets may stand off farther than those of a circle as wide as the extent (a gentle arc of a large
   * radius): the diameter of the circle whose facets stand off alike, mm.
   */
  widestMm?(solid: S): number;
  /** Extent of the upright box along x, y, z, mm. */
  extent(solid: S): Vec3;
  /** Where the kind has an axis: the directions it may take, and the one when none is said. */
  axes: { usual: Axis; choices: readonly Axis[] } | null;
  /** The sizes that are typed, in drawing order. */
  sizes(solid: S): readonly Size[];
  /**
   * What was measured of a solid whose lengths are not typed one by one, and the solid with that length larger: each
   * has the ± of a size. Left out: the sizes.
   */
  measured?(
    solid: S,
  ): readonly { path: readonly string[]; sizeMm: number; grown(byMm: number): S }[];
  /** The sizes in one phrase for the list: "900 × 500 × 300". */
  words(solid: S): string;
  /**
   * How its mesh is made, in the own frame; `facets` chords to a full turn (a multiple of 4) where it is
   * curved, standing so that equal surfaces of two solids get equal facets.
   */
  shape(solid: S, facets: number, tank: TankDirections): Shape;
  /** Greatest u·p over the solid in its own frame, closed form; `up` a unit vector in that frame. */
  support(solid: S, up: Vec3): number;
  /** Stretches of a line of the own frame inside the solid, surface included within `slack` mm; closed form. */
  chords(solid: S, line: Line, slack: number): readonly Interval[];
  /** Exact volume, mm³. */
  volume(solid: S): number;
  /**
   * What is left when `wallMm` is taken off every face, where that is another solid of the kind: it and where the
   * middle of its box stands in the own frame of the first; null when nothing is left. Closed form. undefined (or
   * no such function): not of the kind, so it is worked out from `shape`.
   */
  eroded?(solid: S, wallMm: number): { solid: S; shift: Vec3 } | null | undefined;
  /** Faults the schema cannot see, by field: options that contradict each other. */
  faults(solid: S): readonly { path: readonly string[]; detail: string }[];
  /** A new one, of a size that suits the bench. */
  blank(id: string): S;
}
