import { flatFaces } from './flat-faces';
import type { Mesh } from './mesh';
import { fanAt, seamPiece } from './seam-piece';
import { seamRuns } from './seam-runs';
import type { Bounds } from './shape-bounds';
import { shellPiece } from './shell-piece';
import { unionFind } from './union-find';
import { along, cross, dot, type Vec3 } from './vec3';

/** An edge flatter than this is the rounding of places: whichever way it bends, its faces are offset together. Radians */
const flat = 1e-4;

/** A convex body is the hull of its points; any other is a closed mesh. */
export type WallPiece = { points: Vec3[] } | { mesh: Mesh };

/** Faces that meet at a convex edge flatter than this are offset together: 20 chords to a turn and finer. Radians */
const smooth = 0.32;

/**
 * All that lies within `wallMm` under the surface of a closed mesh, as bodies: a shell on the inside of every
 * face (or of smooth runs of faces at once), a fan of chords along every re-entrant edge, a cap at every vertex that
 * juts into the space. What the mesh encloses less all of them is its inward offset by a ball. Exact for flat
 * faces; fans have chords that keep the area of their arc, caps are inscribed.
 *
 * @param chordAngle greatest angle of a chord of a fan, radians
 * @param near only what reaches into one of these bounds; left out: everything
 */
export function wallPieces(
  mesh: Mesh,
  wallMm: number,
  chordAngle: number,
  near?: readonly Bounds[],
): WallPiece[] {
  const { faces, edges } = flatFaces(mesh);
  const at = (vertex: number): Vec3 => [
    mesh.positions[3 * vertex]!,
    mesh.positions[3 * vertex + 1]!,
    mesh.positions[3 * vertex + 2]!,
  ];
  const wanted = (points: readonly Vec3[]) =>
    near === undefined || near.some((bounds) => reaches(points, wallMm, bounds));
  const faceWanted = faces.map(({ triangles }) =>
    wanted(triangles.flatMap((n) => [0, 1, 2].map((k) => at(mesh.triangles[n + k]!)))),
  );
  const bent = edges.map(({ from, to, left, right }) => {
    const [a, b] = [at(from), at(to)];
    const edge: Vec3 = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
    const length = Math.hypot(...edge);
    const [n1, n2] = [faces[left]!.normal, faces[right]!.normal];
    const turn = length > 0 ? dot(cross(n1, n2), edge) / length : 0;
    return { a, b, edge, length, turn, angle: Math.atan2(Math.abs(turn), dot(n1, n2)) };
  });

  const runs = unionFind(faces.length);
  edges.forEach(({ left, right }, e) => {
    const { turn, angle } = bent[e]!;
    if (!faceWanted[left] || !faceWanted[right]) return;
    if (angle < flat || (turn >= 0 && angle < smooth)) runs.join(left, right);
  });
  const members = new Map<number, number[]>();
  faces.forEach((_, face) => {
    if (!faceWanted[face]) return;
    const list = members.get(runs.find(face));
    if (list) list.push(face);
    else members.set(runs.find(face), [face]);
  });
  const patchOf = (list: readonly number[]) => ({
    triangles: list.flatMap((face) => faces[face]!.triangles),
    normals: list.flatMap((face) => faces[face]!.triangles.map(() => faces[face]!.normal)),
  });
  const pieces: WallPiece[] = [];
  for (const list of members.values()) {
    const together = shellPiece(mesh, patchOf(list), wallMm);
    if (together) pieces.push({ mesh: together });
    else {
      // bent more sharply than the wall is thick: each face by itself
      for (const face of list) pieces.push({ mesh: shellPiece(mesh, patchOf([face]), wallMm)! });
    }
  }

  const reentrant = edges.flatMap((edge, e) => {
    const { a, b, turn, angle } = bent[e]!;
    return turn < 0 && angle > flat && wanted([a, b]) ? [{ ...edge, ...bent[e]! }] : [];
  });
  for (const run of seamRuns(reentrant, (face) => runs.find(face))) {
    const chords = Math.max(1, ...run.map(({ angle }) => Math.ceil(angle / chordAngle - 1e-9)));
    const edgesOf = run.map(({ from, to, left, right }) => ({
      from,
      to,
      left: faces[left]!.normal,
      right: faces[right]!.normal,
    }));
    const together = seamPiece(mesh, edgesOf, wallMm, chords);
    if (together) pieces.push({ mesh: together });
    else {
      for (const { from, to, left, right } of edgesOf) {
        const fan = fanAt(left, right, wallMm, chords);
        pieces.push({
          points: [from, to].flatMap((v) => fan.map((d) => along(at(v), d, 1))),
        });
      }
    }
  }

  const reentrantAt = new Map<number, Vec3[]>();
  const note = (vertex: number, direction: Vec3) => {
    const list = reentrantAt.get(vertex);
    if (list) list.push(direction);
    else reentrantAt.set(vertex, [direction]);
  };
  for (const { from, to, edge, length } of reentrant) {
    note(from, scaled(edge, 1 / length));
    note(to, scaled(edge, -1 / length));
  }
  for (const [vertex, directions] of reentrantAt) {
    if (directions.length < 3) continue;
    const cap = capAt(directions, chordAngle);
    if (cap) pieces.push({ points: [at(vertex), ...cap.map((d) => along(at(vertex), d, wallMm))] });
  }
  return pieces;
}

/**
 * Unit vectors of the cap at a vertex whose nearest places lie inside the mesh: the directions that make no acute
 * angle with any edge there. null where there are none but a line or a plane of them.
 */
function capAt(edges: readonly Vec3[], chordAngle: number): Vec3[] | null {
  const rays: Vec3[] = [];
  for (let i = 0; i < edges.length; i += 1) {
    for (let j = i + 1; j < edges.length; j += 1) {
      const normal = cross(edges[i]!, edges[j]!);
      const size = Math.hypot(...normal);
      if (size < 1e-7) continue;
      for (const sign of [1, -1]) {
        const ray = scaled(normal, sign / size);
        if (edges.every((edge) => dot(edge, ray) <= 1e-7)) rays.push(ray);
      }
    }
  }
  if (rays.length < 3) return null;
  const middle = rays.reduce<Vec3>((sum, ray) => along(sum, ray, 1), [0, 0, 0]);
  const size = Math.hypot(...middle);
  if (size < 1e-3) return null;
  const centre = scaled(middle, 1 / size);
  const widest = Math.max(...rays.map((ray) => Math.acos(Math.min(1, dot(ray, centre)))));
  if (widest < chordAngle / 2) return rays;
  // filled by a grid over each triangle of two rays and the middle: the hull takes what stands out
  const filled: Vec3[] = [];
  const parts = Math.ceil((2 * widest) / chordAngle);
  for (let i = 0; i < rays.length; i += 1) {
    for (let j = i + 1; j < rays.length; j += 1) {
      for (let a = 0; a <= parts; a += 1) {
        for (let b = 0; a + b <= parts; b += 1) {
          const mixed = along(along(scaled(rays[i]!, a), rays[j]!, b), centre, parts - a - b);
          filled.push(scaled(mixed, 1 / Math.hypot(...mixed)));
        }
      }
    }
  }
  return filled;
}

function reaches(points: readonly Vec3[], mm: number, { low, high }: Bounds): boolean {
  return [0, 1, 2].every(
    (axis) =>
      Math.min(...points.map((point) => point[axis]!)) <= high[axis]! + mm &&
      Math.max(...points.map((point) => point[axis]!)) >= low[axis]! - mm,
  );
}

function scaled(vector: Vec3, factor: number): Vec3 {
  return [factor * vector[0], factor * vector[1], factor * vector[2]];
}
