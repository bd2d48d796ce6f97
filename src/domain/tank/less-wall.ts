import { erodedShape } from '../../geometry/eroded-shape';
import type { Interval } from '../../geometry/intervals';
import { meshOf } from '../../geometry/manifold';
import { meshChords } from '../../geometry/mesh-chords';
import { levels, type Mesh } from '../../geometry/mesh';
import { placing, type Placing } from '../../geometry/placing';
import { dot } from '../../geometry/vec3';
import type { Kind } from './kinds/kind';
import type { Solid } from './kinds/registry';
import type { PlacedSolid } from './placed-solid';
import type { Vec3 } from './solid';

/** Facets to a turn of the mesh that a solid without a closed form of its own is looked up in. */
const lookUpFacets = 256;
const lookUpFacetsTwice = 96;

/**
 * What is left of a solid when `wallMm` is taken off every face of it, as a solid of its own; null when nothing
 * is. In closed form where its kind knows it; else by offset of its mesh: exact for flat faces, within what
 * facets stand off for round ones. Needs loadManifold() first.
 */
export function lessWall(drawn: PlacedSolid, wallMm: number): PlacedSolid | null {
  const { kind, solid, place } = drawn;
  // a ball of the wall's thickness about what is left reaches from face to face of the solid's box
  if (2 * wallMm > Math.min(...kind.extent(solid))) return null;
  const left = kind.eroded?.(solid, wallMm);
  if (left === null) return null;
  if (left) {
    return { ...drawn, solid: left.solid, place: moved(place, left.shift), drawn };
  }
  const worked = offsetKind(drawn, wallMm);
  return worked && { ...drawn, kind: worked, drawn };
}

const upright = { x: [1, 0, 0], z: [0, 0, 1] } as const;
const nothing: Mesh = { positions: new Float64Array(0), triangles: new Uint32Array(0) };

function moved(place: Placing, shift: Vec3): Placing {
  const centre = place.rows.map((row, i) => place.centre[i]! + dot(row, shift));
  return { ...place, centre: centre as [number, number, number] };
}

function offsetKind({ kind, solid }: PlacedSolid, wallMm: number): Kind<Solid> | null {
  const facets = kind.curved(solid) === 'twice' ? lookUpFacetsTwice : lookUpFacets;
  const shape = erodedShape(kind.shape(solid, facets, upright), wallMm, facets);
  if (!shape) return null;
  const mesh = meshOf({ shape, place: placing([0, 0, 0], [0, 0, 0], [0, 0, 0]) }, [0, 0, 0]);
  if (mesh.triangles.length === 0) return null;
  const lookUp = meshChords(mesh);
  // half the arrow of a chord, as in facet-stand-off
  const standOff = kind.curved(solid) ? (4 * Math.max(...kind.extent(solid))) / facets ** 2 : 0;
  /** The wall straight inside the drawn surface, where the mesh agrees that this is what stands there. */
  const agreed = (straight: number, ofMesh: number) =>
    Math.abs(straight - ofMesh) <= standOff ? straight : ofMesh;
  return {
    ...kind,
    shape: (_solid, count, tank) =>
      erodedShape(kind.shape(solid, count, tank), wallMm, count) ?? { form: 'mesh', mesh: nothing },
    support: (_solid, up) =>
      agreed(
        kind.support(solid, up) - wallMm,
        levels(mesh, up).reduce((most, level) => Math.max(most, level), -Infinity),
      ),
    chords(_solid, line, slack): readonly Interval[] {
      const outer = kind.chords(solid, line, slack);
      const left = lookUp(line, slack);
      return left.map(({ from, to }) => ({
        from: outer.reduce((at, one) => agreed(one.from + wallMm, at), from),
        to: outer.reduce((at, one) => agreed(one.to - wallMm, at), to),
      }));
    },
  };
}
