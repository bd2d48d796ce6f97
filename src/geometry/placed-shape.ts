import type { Placing } from './placing';
import type { Shape } from './shape';

/** A shape and where it stands. */
export interface PlacedShape {
  shape: Shape;
  place: Placing;
}
