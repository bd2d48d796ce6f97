import { polygonArea } from '../../../../geometry/outline-area';
import { outlineSupport } from '../../../../geometry/outline-support';
import type { RoundedOutline } from '../../../../geometry/rounded-outline';
import type { Vec2 } from '../../../../geometry/shape';
import type { Prism } from './schema';

/** Outline of a prism in its own frame and the lengths of its box, mm. */
export interface PrismOutline {
  /** In (z, x), the outline's directions along y, against the clock. */
  outline: RoundedOutline;
  x: number;
  z: number;
}

/** The profile as geometry wants it: against the clock, about the middle of its box (that of the rounded profile). */
export function outlineOf({ profile }: Prism): PrismOutline {
  const asDrawn = profile.map(([x, z, radius = 0]) => ({ corner: [z, x] as Vec2, radius }));
  if (polygonArea(asDrawn.map(({ corner }) => corner)) < 0) asDrawn.reverse();
  const corners = asDrawn.map(({ corner }) => corner);
  const radii = asDrawn.map(({ radius }) => radius);
  const reach = (direction: Vec2) => outlineSupport({ corners, radii }, direction);
  const [highZ, lowZ] = [reach([1, 0]), -reach([-1, 0])];
  const [highX, lowX] = [reach([0, 1]), -reach([0, -1])];
  const [middleZ, middleX] = [(highZ + lowZ) / 2, (highX + lowX) / 2];
  return {
    outline: { corners: corners.map(([z, x]) => [z - middleZ, x - middleX]), radii },
    x: highX - lowX,
    z: highZ - lowZ,
  };
}
