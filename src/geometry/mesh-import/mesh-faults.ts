import { enclosedVolume, type Mesh } from '../mesh';
import type { Vec3 } from '../vec3';
import { boundsOf } from './bounds';
import { edgeFaults, endOf } from './edge-faults';
import { holesOf } from './holes';
import { spacedCount } from './mesh-caps';
import { overlapPlace } from './overlaps';
import { shellSides } from './shell-sides';
import { weldRims } from './weld-rims';
import { withVertices } from './with-vertices';

/** A mesh made fit to be a solid, or why it is not. Places are in the mesh's own numbers. */
export interface CheckedMesh {
  /** Closed and outward when there are no faults. */
  mesh: Mesh;
  /** What was mended, one sentence each. */
  notes: string[];
  /** Why it is no solid, one sentence each, with a count and a place. */
  faults: string[];
}

/** Corners on rims this near to each other, as a part of the size, are one. */
const nearOfSize = 1e-6;
/** Beyond so many open edges the mesh is a heap of loose triangles, not one with a seam. */
const mostSeamEdges = 200_000;

/**
 * Whether a mesh encloses space, told in sentences. Mended and noted: triangles without area, seams open by less
 * than 1e-6 of the size, a mesh that is inside out as a whole. Faults: holes, edges of more than two faces, faces or
 * shells turned the wrong way, overlaps (overlaps.ts says how fine they are looked for), no volume.
 */
export function meshFaults(raw: Mesh): CheckedMesh {
  const notes: string[] = [];
  const faults: string[] = [];
  let { mesh, dropped } = withVertices(raw, (vertex) => vertex);
  if (mesh.triangles.length === 0) {
    return { mesh, notes, faults: ['The file holds no triangle with an area.'] };
  }
  const { size } = boundsOf(mesh);
  const near = nearOfSize * Math.hypot(...size);
  let edges = edgeFaults(mesh.triangles);
  if (edges.open.length > 0 && edges.open.length <= mostSeamEdges) {
    const welded = weldRims(mesh, edges.open, near);
    const edgesAfter = edgeFaults(welded.triangles);
    if (edgesAfter.open.length < edges.open.length && welded.triangles.length > 0) {
      const closed = (edges.open.length - edgesAfter.open.length) / 2;
      notes.push(
        `${counted(Math.ceil(closed), 'edge of a seam was', 'edges of seams were')} open by less than a millionth of the size and closed.`,
      );
      dropped += (mesh.triangles.length - welded.triangles.length) / 3;
      mesh = welded;
      edges = edgesAfter;
    }
  }
  if (dropped > 0) {
    notes.unshift(`${counted(dropped, 'triangle', 'triangles')} without area left out.`);
  }

  if (edges.open.length > 0) faults.push(holesSentence(mesh, edges.open));
  if (edges.crowded.length > 0) {
    faults.push(
      `${counted(edges.crowded.length, 'edge has', 'edges have')} more than two faces, the first near ${middleOf(mesh, edges.crowded[0]!)}: join the bodies that meet there, or part them.`,
    );
  }
  if (edges.turned.length > 0) {
    faults.push(
      `Faces look opposite ways across ${counted(edges.turned.length, 'edge', 'edges')}, the first near ${middleOf(mesh, edges.turned[0]!)}: turn the faces so that all look outward.`,
    );
  }
  if (faults.length > 0) return { mesh, notes, faults };

  const enclosed = Math.abs(enclosedVolume(mesh, boundsOf(mesh).low));
  if (!(enclosed > 1e-12 * Math.hypot(...size) ** 3)) {
    return { mesh, notes, faults: ['The mesh is closed but flat: it encloses no volume.'] };
  }
  const shells = shellSides(mesh);
  const wrong = shells.filter(({ volume, isVoid }) => volume < 0 !== isVoid);
  if (wrong.length === shells.length) {
    mesh = { positions: mesh.positions, triangles: turnedOver(mesh.triangles) };
    notes.push('The mesh was inside out and was turned over.');
  } else if (wrong.length > 0) {
    const first = wrong[0]!;
    faults.push(
      `${spacedCount(wrong.length)} of ${spacedCount(shells.length)} shells ${wrong.length === 1 ? 'has its' : 'have their'} faces turned the wrong way, the first with its top near ${placeWords(first.top)}: ${
        first.isVoid
          ? 'a shell inside another bounds a void and looks inward; join what is meant as one body.'
          : 'a shell that stands by itself looks outward.'
      }`,
    );
  }
  if (faults.length === 0) {
    const overlap = overlapPlace(mesh);
    if (overlap) {
      faults.push(
        `The mesh crosses itself or its bodies overlap, found near ${placeWords(overlap)}: join them into one body.`,
      );
    }
  }
  return { mesh, notes, faults };
}

/** "x 12.5, y 0, z 300", four digits of the file's numbers. */
export function placeWords(at: Vec3): string {
  return at.map((value, axis) => `${'xyz'[axis]} ${Number(value.toPrecision(4))}`).join(', ');
}

function holesSentence(mesh: Mesh, open: Uint32Array): string {
  const holes = holesOf(mesh, open);
  const named = holes
    .slice(0, 3)
    .map(({ at, edges }) => `near ${placeWords(at)} (${counted(edges, 'edge', 'edges')})`);
  const more =
    holes.length > named.length ? ` and ${spacedCount(holes.length - named.length)} more` : '';
  return `The mesh is not closed: ${counted(holes.length, 'hole', 'holes')}, ${named.join('; ')}${more}. Close it in the program that wrote it.`;
}

function counted(count: number, one: string, many: string): string {
  return `${spacedCount(count)} ${count === 1 ? one : many}`;
}

function middleOf({ positions, triangles }: Mesh, n: number): string {
  const [from, to] = [3 * triangles[n]!, 3 * endOf(triangles, n)];
  const middle = [0, 1, 2].map((axis) => (positions[from + axis]! + positions[to + axis]!) / 2);
  return placeWords(middle as unknown as Vec3);
}

function turnedOver(triangles: Uint32Array): Uint32Array {
  const turned = triangles.slice();
  for (let n = 0; n < turned.length; n += 3) {
    turned[n + 1] = triangles[n + 2]!;
    turned[n + 2] = triangles[n + 1]!;
  }
  return turned;
}
