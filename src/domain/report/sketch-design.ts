import { loadManifold } from '../../geometry/manifold';
import { shifted } from '../../geometry/mesh';
import { extremes } from '../table/extremes';
import { liquidSpace } from '../table/liquid-space';
import { readingFrame } from '../table/reading-frame';
import { refuseUncomputable } from '../table/refuse-uncomputable';
import { stickNotices } from '../table/stick-notices';
import type { TankDocument } from '../tank/document';
import type { PlacedSolid } from '../tank/placed-solid';
import { placedSolids } from '../tank/placed-solids';
import { sketchOf, type Sketch } from './sketch';

const axes = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
] as const;

/**
 * The sketch that a print shows of a design, mm, drawn in the tank's own frame. The mesh serves the eye only:
 * a circle is drawn with 64 chords or fewer, stick and overall sizes come from closed form.
 * Throws `invalid` like computeTable.
 */
export async function sketchDesign(document: TankDocument): Promise<Sketch> {
  refuseUncomputable(document);
  await loadManifold();
  const solids = placedSolids(document);
  const space = liquidSpace(solids, facetsFor(solids));
  const { mesh, origin } = space;
  const frame = readingFrame(document, solids, space);
  const [x, y, z] = axes.map((axis) => extremes(solids, space, axis));
  const extent = { low: [x![0], y![0], z![0]], high: [x![1], y![1], z![1]] } as const;
  return sketchOf(shifted(mesh, origin), frame, stickNotices(solids, space, frame), extent);
}

/**
 * Triangles of a ball grow with the square of its facets and each is held against the edges near it: of many
 * curved solids each is small on paper, and fewer chords keep two hundred balls below 60 000 triangles.
 */
function facetsFor(solids: readonly PlacedSolid[]): number {
  const curved = solids.filter(({ kind, solid }) => kind.curved(solid)).length;
  return curved <= 12 ? 64 : curved <= 48 ? 32 : 16;
}
