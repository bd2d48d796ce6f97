import { boxNeighbours } from './box-neighbours';
import type { Mesh } from './mesh';
import { overlapOf, type FlatTriangle } from './overlap';
import { cross, dot, unit, type Vec3 } from './vec3';

/** Two faces of the mesh that stand back to back, or face to face, closer than they can be built. */
export interface ThinPlace {
  /** `film`: liquid space between them; `wall`: no liquid space between them. */
  what: 'film' | 'wall';
  gapMm: number;
  /** A place where it is so thin, in the mesh's frame. */
  at: Vec3;
}

interface Face {
  normal: Vec3;
  corners: readonly [Vec3, Vec3, Vec3];
  /** Place in the search: the normal along a direction that no face is likely to be square to. */
  key: number;
}

/** Up to so many faces the search by direction is quicker. */
const fewFaces = 4000;

const searchAlong = unit([0.6123, 0.5347, 0.5821]);

/** Cosine of 0.001 rad: a slope steeper than 1 mm in a metre is a taper, not a film. */
const parallel = Math.cos(0.001);

/**
 * The first place where the liquid space, or what parts it, is thinner than `thinMm`: a pair of faces,
 * parallel within 0.001 rad, that look opposite ways, overlap when seen square on, and lie closer than
 * that somewhere in the overlap. null when there is none. Edges and tips that taper to nothing do not count.
 * `only`: films or walls alone.
 */
export function thinPlace(mesh: Mesh, thinMm: number, only?: ThinPlace['what']): ThinPlace | null {
  const faces = facesOf(mesh).sort((one, other) => one.key - other.key);
  return faces.length <= fewFaces ? byNormal(faces, thinMm, only) : byPlace(faces, thinMm, only);
}

/** Few faces: each is held against those that look the opposite way. */
function byNormal(
  faces: readonly Face[],
  thinMm: number,
  only?: ThinPlace['what'],
): ThinPlace | null {
  for (const face of faces) {
    // an opposite face has the opposite key, within the 0.001 rad allowed
    for (let i = firstAtLeast(faces, -face.key - 0.002); i < faces.length; i += 1) {
      const other = faces[i]!;
      if (other.key > -face.key + 0.002) break;
      if (other.key < face.key) continue;
      const found = between(face, other, thinMm);
      if (found && found.what === (only ?? found.what)) return found;
    }
  }
  return null;
}

/** Many, of which half may look one way and half the other (a wall in fine triangles): against those near them. */
function byPlace(
  faces: readonly Face[],
  thinMm: number,
  only?: ThinPlace['what'],
): ThinPlace | null {
  const ends = (side: (...values: number[]) => number, by: number) =>
    faces.map(({ corners: [a, b, c] }): Vec3 => [
      side(a[0], b[0], c[0]) + by,
      side(a[1], b[1], c[1]) + by,
      side(a[2], b[2], c[2]) + by,
    ]);
  const near = boxNeighbours(ends(Math.min, -thinMm), ends(Math.max, thinMm));
  let found: ThinPlace | null = null;
  for (let i = 0; i < faces.length && !found; i += 1) {
    near.of(i, (other) => {
      const place = between(faces[i]!, faces[other]!, thinMm);
      if (place && place.what === (only ?? place.what)) found ??= place;
    });
  }
  return found;
}

function between(face: Face, other: Face, thinMm: number): ThinPlace | null {
  if (dot(face.normal, other.normal) > -parallel) return null;
  const gap = dot(face.normal, from(face.corners[0], other.corners[0]));
  const reach = 0.002 * size(face, other);
  return Math.abs(gap) > thinMm + reach ? null : closest(face, other, thinMm);
}

function closest(face: Face, other: Face, thinMm: number): ThinPlace | null {
  const first = unit(from(face.corners[0], face.corners[1]));
  const second = cross(face.normal, first);
  const origin = face.corners[0];
  const flat = ({ corners }: Face) =>
    corners.map((corner) => {
      const d = from(origin, corner);
      return [dot(first, d), dot(second, d)] as const;
    }) as unknown as FlatTriangle;
  const overlap = overlapOf(flat(face), flat(other));
  if (!overlap) return null;
  let least: ThinPlace | null = null;
  for (const [x, y] of overlap) {
    // how far along the first normal the other plane lies over this point of the first
    const at: Vec3 = [0, 1, 2].map(
      (i) => origin[i]! + x * first[i]! + y * second[i]!,
    ) as unknown as Vec3;
    const gap = dot(other.normal, from(at, other.corners[0])) / dot(other.normal, face.normal);
    if (Math.abs(gap) < thinMm && (!least || Math.abs(gap) < least.gapMm)) {
      least = { what: gap < 0 ? 'film' : 'wall', gapMm: Math.abs(gap), at };
    }
  }
  return least;
}

function facesOf({ positions, triangles }: Mesh): Face[] {
  const vertex = (i: number): Vec3 => [
    positions[3 * i]!,
    positions[3 * i + 1]!,
    positions[3 * i + 2]!,
  ];
  const faces: Face[] = [];
  for (let n = 0; n < triangles.length; n += 3) {
    const corners = [
      vertex(triangles[n]!),
      vertex(triangles[n + 1]!),
      vertex(triangles[n + 2]!),
    ] as const;
    const normal = cross(from(corners[0], corners[1]), from(corners[0], corners[2]));
    if (Math.hypot(...normal) < 1e-9) continue;
    const direction = unit(normal);
    faces.push({ normal: direction, corners, key: dot(direction, searchAlong) });
  }
  return faces;
}

function size(one: Face, other: Face): number {
  const [a, b, c] = one.corners;
  return Math.max(...[b, c, ...other.corners].map((corner) => Math.hypot(...from(a, corner))));
}

function from(a: Vec3, b: Vec3): Vec3 {
  return [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
}

function firstAtLeast(faces: readonly Face[], key: number): number {
  let low = 0;
  let high = faces.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (faces[middle]!.key >= key) high = middle;
    else low = middle + 1;
  }
  return low;
}
