import { spaceOf } from '../../geometry/manifold';
import { enclosedVolume, type Mesh } from '../../geometry/mesh';
import { dustOfCapacity } from '../../geometry/tolerance';
import type { Vec3 } from '../../geometry/vec3';
import { invalid } from '../errors';
import { nothingInsideWall } from '../tank/placed-solids';
import { highestLevel, placedShape, type PlacedSolid } from '../tank/placed-solid';

/** Union of all that holds minus all that displaces, as a mesh; with outside sizes the wall is off (placedSolids). */
export interface LiquidSpace {
  /** In the tank's frame moved by −origin, so that a tank far from its origin loses no digits. mm */
  mesh: Mesh;
  origin: Vec3;
  /** Chords to a full turn of every curved surface. */
  facets: number;
  volumeMm3: number;
}

/** Needs loadManifold() first. Throws `invalid` when nothing holds liquid or nothing is left of it. */
export function liquidSpace(solids: readonly PlacedSolid[], facets: number): LiquidSpace {
  const holds = solids.filter(({ solid }) => solid.role === 'holds');
  if (holds.length === 0) {
    throw invalid('/solids', 'The liquid space is empty: no solid has the role "holds".');
  }
  const displaces = solids.filter(({ solid }) => solid.role === 'displaces');
  const origin = middleOf(holds);
  const shapes = (list: readonly PlacedSolid[]) => list.map((one) => placedShape(one, facets));
  const mesh = spaceOf(shapes(holds), shapes(displaces), origin);
  const volumeMm3 = enclosedVolume(mesh);
  const held = holds.reduce((sum, { kind, solid }) => sum + kind.volume(solid), 0);
  if (!(volumeMm3 > dustOfCapacity * held)) {
    if (displaces.length === 0 && holds.some(({ drawn }) => drawn)) throw nothingInsideWall();
    throw invalid(
      '/solids',
      'The liquid space is empty: what displaces takes away all that holds.',
    );
  }
  return { mesh, origin, facets, volumeMm3 };
}

function middleOf(holds: readonly PlacedSolid[]): Vec3 {
  const middle = ([x, y, z]: Vec3) => {
    const drawn = holds.map((one) => one.drawn ?? one);
    const high = Math.max(...drawn.map((one) => highestLevel(one, [x, y, z])));
    const low = -Math.max(...drawn.map((one) => highestLevel(one, [-x, -y, -z])));
    return Math.round((low + high) / 2);
  };
  return [middle([1, 0, 0]), middle([0, 1, 0]), middle([0, 0, 1])];
}
