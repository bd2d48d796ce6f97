import { flatFaces } from './flat-faces';
import { hullOf, meshLess } from './manifold';
import type { Mesh } from './mesh';
import { cross, dot, type Vec3 } from './vec3';
import { wallPieces } from './wall-pieces';

/**
 * Inward offset of a closed mesh by `wallMm`: all points that no ball of that radius about them takes outside.
 * Exact but for the rounding along re-entrant edges, drawn with chords of `chordAngle` radians at most (see
 * wallPieces). No triangles when nothing is left. A convex mesh about its own origin costs O(n log n); any other
 * one boolean a face. Needs loadManifold() first.
 */
export function erodedMesh(mesh: Mesh, wallMm: number, chordAngle: number): Mesh {
  return (
    convexEroded(mesh, wallMm) ??
    meshLess([mesh], [], (whole) => wallPieces(whole, wallMm, chordAngle))
  );
}

/**
 * The offset of a convex mesh is what the half-spaces behind its faces, moved in, have in common. Seen from a
 * point inside, a plane n·p = d has the pole n/d; the faces of the hull of all poles are the corners of what is
 * left. null when the mesh is not convex or the origin does not lie well inside what is left.
 */
function convexEroded(mesh: Mesh, wallMm: number): Mesh | null {
  const { faces, edges } = flatFaces(mesh);
  const offsets = faces.map(({ normal, triangles }) =>
    dot(normal, placeOf(mesh, mesh.triangles[triangles[0]!]!)),
  );
  for (const { from, to, left, right } of edges) {
    const edge = minus(placeOf(mesh, to), placeOf(mesh, from));
    const turn = dot(cross(faces[left]!.normal, faces[right]!.normal), edge);
    if (turn < -1e-9 * Math.hypot(...edge)) return null;
  }
  const most = offsets.reduce((one, other) => Math.max(one, other));
  const least = offsets.reduce((one, other) => Math.min(one, other));
  if (least - wallMm < 1e-3 * most) return null;
  // in units of most², so that poles are about as far away as the faces
  const poles = hullOf(
    faces.map(({ normal }, face) => {
      const near = (most * most) / (offsets[face]! - wallMm);
      return [normal[0] * near, normal[1] * near, normal[2] * near] as const;
    }),
  );
  const corners = flatFaces(poles).faces.map(({ normal, triangles }): Vec3 => {
    const far = (most * most) / dot(normal, placeOf(poles, poles.triangles[triangles[0]!]!));
    return [normal[0] * far, normal[1] * far, normal[2] * far];
  });
  return hullOf(corners);
}

function placeOf({ positions }: Mesh, vertex: number): Vec3 {
  return [positions[3 * vertex]!, positions[3 * vertex + 1]!, positions[3 * vertex + 2]!];
}

function minus(a: Vec3, b: Vec3): Vec3 {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}
