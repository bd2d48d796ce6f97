import Module, {
  type Manifold,
  type ManifoldToplevel,
  type Vec2 as MutableVec2,
} from 'manifold-3d';
import { cutCaps } from './cut-caps';
import { distinctRounded } from './distinct-rounded';
import { exactPoints } from './exact-points';
import { gluedCaps } from './glued-caps';
import type { Mesh } from './mesh';
import { placedMesh } from './placed-mesh';
import type { PlacedShape } from './placed-shape';
import { toTank } from './placing';
import { prismMesh } from './prism-mesh';
import { revolvedMesh } from './revolved-mesh';
import { axisOrder, type Axis, type Shape, type Vec2 } from './shape';
import type { Bounds } from './shape-bounds';
import type { Vec3 } from './vec3';
import type { WallPiece } from './wall-pieces';

/**
 * The only file that knows manifold-3d. Booleans of closed meshes; everything it hands out is plain
 * arrays in double precision, and everything it makes inside the library is deleted before it returns.
 */

/** Where the WebAssembly comes from; neither is needed where manifold-3d stands in node_modules. */
export interface ManifoldSource {
  wasmUrl?: string;
  wasmBinary?: ArrayBuffer | Uint8Array;
}

let loading: Promise<void> | undefined;
let library: ManifoldToplevel | undefined;

/** Loads the library once; later calls wait for the first. A failed load may be tried again. */
export function loadManifold(source: ManifoldSource = {}): Promise<void> {
  loading ??= load(source).catch((error: unknown) => {
    loading = undefined;
    throw error;
  });
  return loading;
}

async function load({ wasmUrl, wasmBinary }: ManifoldSource): Promise<void> {
  const options = {
    ...(wasmUrl === undefined ? {} : { locateFile: () => wasmUrl }),
    ...(wasmBinary === undefined ? {} : { wasmBinary }),
  };
  const loaded = await Module(options as Parameters<typeof Module>[0]);
  loaded.setup();
  library = loaded;
}

/**
 * Why the library cannot take a closed mesh in, as a sentence; null when it can. It would lose, when it rounds to 32
 * bits, detail finer than about 1e-7 of the size; that alone is no reason.
 */
export function libraryRefusal(mesh: Mesh): string | null {
  const { Manifold, Mesh: LibraryMesh } = loadedLibrary();
  try {
    const { rounded } = distinctRounded(mesh.positions);
    const taken = Manifold.ofMesh(
      new LibraryMesh({ numProp: 3, vertProperties: rounded, triVerts: mesh.triangles }),
    );
    const status = String(taken.status());
    const empty = taken.isEmpty();
    taken.delete();
    if (status === 'NoError' && !empty) return null;
  } catch {
    // the library's own words name its inner parts; what follows is what a person can act on
  }
  return 'The mesh is closed, but cannot be joined with other solids: let the program that wrote it mend or simplify it.';
}

/** The mesh of one shape alone, in the tank's frame moved by −origin. */
export function meshOf(placed: PlacedShape, origin: Vec3): Mesh {
  const { shape, place } = placed;
  if (shape.form === 'mesh') return placedMesh(shape.mesh, place, origin);
  if (shape.form === 'revolution') return placedMesh(revolvedMesh(shape), place, origin);
  const direct = prismMesh(shape, place, origin);
  if (direct) return direct;
  const made = make(placed, origin);
  try {
    return read(made);
  } finally {
    made.delete();
  }
}

/**
 * Union of `holds` minus union of `displaces`, in the tank's frame moved by −origin. No triangles
 * when nothing is left. Positions are the library's doubles, not its 32-bit copies.
 */
export function spaceOf(
  holds: readonly PlacedShape[],
  displaces: readonly PlacedShape[],
  origin: Vec3,
): Mesh {
  if (holds.length === 1 && displaces.length === 0) return meshOf(holds[0]!, origin);
  const cut = cutCaps(holds, displaces);
  if (cut) {
    const space = joinedSpace(cut.holds, cut.displaces, origin);
    const whole = cut.caps.length === 0 ? space : gluedCaps(space, cut.caps, origin);
    if (whole) return whole;
  }
  return joinedSpace(holds, displaces, origin);
}

/**
 * So many solids that displace are taken away one after another: where they cross each other outside of all that holds,
 * joining them first can take twenty times as long.
 */
const mostOneByOne = 12;

function joinedSpace(
  holds: readonly PlacedShape[],
  displaces: readonly PlacedShape[],
  origin: Vec3,
): Mesh {
  const { Manifold } = loadedLibrary();
  const bin: Manifold[] = [];
  const keep = (one: Manifold) => {
    bin.push(one);
    return one;
  };
  try {
    let space = joined(holds);
    if (displaces.length <= mostOneByOne) {
      for (const one of displaces)
        space = keep(Manifold.difference(space, keep(make(one, origin))));
    } else space = keep(Manifold.difference(space, joined(displaces)));
    return read(space);
  } finally {
    for (const one of bin) one.delete();
  }

  function joined(list: readonly PlacedShape[]): Manifold {
    const parts = list.map((one) => keep(make(one, origin)));
    return parts.length === 1 ? parts[0]! : keep(Manifold.union(parts));
  }
}

/** The part of a union of closed meshes inside any of the boxes (everything when there are none), less the pieces. */
export function meshLess(
  union: readonly Mesh[],
  boxes: readonly Bounds[],
  pieces: (whole: Mesh) => readonly WallPiece[],
): Mesh {
  const { Manifold } = loadedLibrary();
  const bin: Manifold[] = [];
  const keep = (one: Manifold) => {
    bin.push(one);
    return one;
  };
  try {
    const parts = union.map((mesh) => keep(ofMesh(mesh)));
    const whole = parts.length === 1 ? parts[0]! : keep(Manifold.union(parts));
    const taken = pieces(read(whole)).map((piece) =>
      keep('mesh' in piece ? ofMesh(piece.mesh) : Manifold.hull(mutablePoints(piece.points))),
    );
    let rest = whole;
    if (boxes.length > 0) {
      const solids = boxes.map(({ low, high }) => {
        const cube = keep(Manifold.cube([high[0] - low[0], high[1] - low[1], high[2] - low[2]]));
        return keep(cube.translate([low[0], low[1], low[2]]));
      });
      rest = keep(Manifold.intersection(rest, keep(Manifold.union(solids))));
    }
    if (taken.length > 0) rest = keep(Manifold.difference(rest, keep(Manifold.union(taken))));
    return read(rest);
  } finally {
    for (const one of bin) one.delete();
  }
}

/**
 * Inward offset of flat outlines by `mm`: what remains, as outlines against the clock; none when nothing does.
 * Corners stay corners, re-entrant ones become arcs of `facets` chords to a turn. On the library's grid of 1e-8 mm.
 * With `turned`, outlines are profiles (radius, place) of a body turned about radius 0: there is no wall there.
 */
export function outlinesLess(
  outlines: readonly (readonly Vec2[])[],
  mm: number,
  facets: number,
  turned: boolean,
): Vec2[][] {
  const { CrossSection } = loadedLibrary();
  const bin: { delete(): void }[] = [];
  const keep = <T extends { delete(): void }>(one: T) => {
    bin.push(one);
    return one;
  };
  try {
    const drawn = keep(new CrossSection(outlines.map(mutable), 'NonZero'));
    if (!turned) return keep(drawn.offset(-mm, 'Round', 2, facets)).toPolygons();
    const whole = keep(CrossSection.union(drawn, keep(drawn.mirror([1, 0]))));
    const left = keep(whole.offset(-mm, 'Round', 2, facets));
    const { min, max } = left.bounds();
    if (!(max[0] > 0)) return [];
    const half = keep(
      new CrossSection([
        [
          [0, min[1] - 1],
          [max[0] + 1, min[1] - 1],
          [max[0] + 1, max[1] + 1],
          [0, max[1] + 1],
        ],
      ]),
    );
    return keep(CrossSection.intersection(left, half)).toPolygons();
  } finally {
    for (const one of bin) one.delete();
  }
}

/** The convex hull of points, as a mesh; no triangles when they lie in one plane. */
export function hullOf(points: readonly Vec3[]): Mesh {
  const hull = loadedLibrary().Manifold.hull(mutablePoints(points));
  try {
    return read(hull);
  } finally {
    hull.delete();
  }
}

function mutablePoints(points: readonly Vec3[]): [number, number, number][] {
  return points.map(([x, y, z]) => [x, y, z]);
}

function loadedLibrary(): ManifoldToplevel {
  if (!library) throw new Error('loadManifold() must be awaited before a mesh is made');
  return library;
}

function make({ shape, place }: PlacedShape, origin: Vec3): Manifold {
  const { Manifold } = loadedLibrary();
  if (shape.form === 'mesh') return ofMesh(placedMesh(shape.mesh, place, origin));
  if (shape.form === 'revolution') return ofMesh(placedMesh(revolvedMesh(shape), place, origin));
  const prism = prismMesh(shape, place, origin);
  if (prism) {
    // a convex prism is the hull of its corners, which keeps their doubles and costs half as much
    const corners = Array.from({ length: prism.positions.length / 3 }, (_, i) =>
      vertexOf(prism.positions, i),
    );
    const hull = Manifold.hull(corners);
    if (hull.numVert() === corners.length) return hull;
    // corners so near to flat that the hull left some out
    hull.delete();
  }
  const raw = Manifold.extrude([mutable(shape.outline)], shape.length, 0, 0, [1, 1], true);
  try {
    const toOwnFrame = extrudedIn(shape);
    return raw.warpBatch((vertices) => {
      for (let i = 0; i < vertices.length; i += 3) {
        const own = toOwnFrame(vertices[i]!, vertices[i + 1]!, vertices[i + 2]!);
        const [x, y, z] = toTank(place, own);
        vertices[i] = x - origin[0];
        vertices[i + 1] = y - origin[1];
        vertices[i + 2] = z - origin[2];
      }
    });
  } finally {
    raw.delete();
  }
}

/**
 * A closed mesh taken in with its doubles. The library takes 32-bit positions and sorts vertices, so each goes
 * in under a rounded place of its own and is warped to where it stands. Throws when the mesh is not closed.
 */
function ofMesh({ positions, triangles }: Mesh): Manifold {
  const { Manifold, Mesh: LibraryMesh } = loadedLibrary();
  const { rounded, vertexAt } = distinctRounded(positions);
  const raw = Manifold.ofMesh(
    new LibraryMesh({ numProp: 3, vertProperties: rounded, triVerts: triangles }),
  );
  try {
    return raw.warpBatch((vertices) => {
      for (let i = 0; i < vertices.length; i += 3) {
        const vertex = vertexAt(vertices[i]!, vertices[i + 1]!, vertices[i + 2]!);
        for (let axis = 0; axis < 3; axis += 1) vertices[i + axis] = positions[3 * vertex + axis]!;
      }
    });
  } finally {
    raw.delete();
  }
}

type IntoOwn = (a: number, b: number, c: number) => Vec3;

/** From the library's extrusion (along z, outline in x and y, on its coarse grid) to the own frame, exactly. */
function extrudedIn({ axis, outline, length }: Extract<Shape, { form: 'extrusion' }>): IntoOwn {
  const turn = turnedIn(axis);
  const exact = exactPoints(outline);
  return (a, b, c) => {
    const [first, second] = exact(a, b);
    return turn(first, second, c < 0 ? -length / 2 : length / 2);
  };
}

function turnedIn(axis: Axis): IntoOwn {
  const [first, second, third] = axisOrder(axis);
  const own: [number, number, number] = [0, 0, 0];
  return (a, b, c) => {
    own[first] = a;
    own[second] = b;
    own[third] = c;
    return own;
  };
}

function vertexOf(positions: Float64Array, i: number): [number, number, number] {
  return [positions[3 * i]!, positions[3 * i + 1]!, positions[3 * i + 2]!];
}

function mutable(outline: readonly (readonly [number, number])[]): MutableVec2[] {
  return outline.map(([a, b]) => [a, b]);
}

/**
 * getMesh() rounds positions to 32 bits, which costs 1.7e-6 of a tank that stands 20 m from the
 * origin; a warp that changes nothing shows the doubles in the same order.
 */
function read(solid: Manifold): Mesh {
  if (solid.isEmpty()) return { positions: new Float64Array(0), triangles: new Uint32Array(0) };
  const rounded = solid.getMesh();
  let positions = new Float64Array(0);
  const copy = solid.warpBatch((vertices) => {
    positions = vertices.slice();
  });
  copy.delete();
  for (let i = 0; i < positions.length; i += 1) {
    if (Math.fround(positions[i]!) !== rounded.vertProperties[i]) {
      throw new Error('manifold-3d handed out vertices in another order than its triangles use');
    }
  }
  return { positions, triangles: rounded.triVerts.slice() };
}
