import { loadManifold, meshOf } from '../../geometry/manifold';
import { shifted } from '../../geometry/mesh';
import { roundingOfCapacity } from '../../geometry/tolerance';
import type { TankDocument } from '../tank/document';
import { placedShape, placedSolid } from '../tank/placed-solid';
import { placedSolids } from '../tank/placed-solids';
import { extremes } from './extremes';
import { levelRows } from './level-rows';
import { liquidSpace } from './liquid-space';
import { openings } from './openings';
import { pieceNotice } from './piece-notice';
import { piecesOf } from './pieces';
import type { Preview } from './preview';
import { readingFrame } from './reading-frame';
import { refuseUncomputable } from './refuse-uncomputable';
import { stickNotices } from './stick-notices';
import { wallNotices } from './wall-notices';
import { tableRows } from './table-rows';

/** Chords to a full turn in the live view: fewer where many solids are bent two ways. The bound compares with 32. */
const usualFacets = 64;
const heavyFacets = 48;
const coarseFacets = 32;

/** So many formed ends, balls or rounded boxes are heavy: at 64 facets their edit would take more than 50 ms. */
const heavySolids = 3;

const previewRows = 201;

const axes = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
] as const;

/**
 * All that the bench shows of a design, at 64 or 48 facets a turn (1e-6 to 5e-5 of capacity). Solids are shown as drawn,
 * the space less the wall where sizes are outside ones. A few solids take
 * some milliseconds once the WebAssembly is warm. Throws `invalid` like computeTable.
 */
export async function computePreview(document: TankDocument): Promise<Preview> {
  refuseUncomputable(document);
  await loadManifold();
  const solids = placedSolids(document);
  const bent = solids.filter(({ kind, solid }) => kind.curved(solid) === 'twice').length;
  const previewFacets = bent >= heavySolids ? heavyFacets : usualFacets;
  const space = liquidSpace(solids, previewFacets);
  const frame = readingFrame(document, solids, space);
  const depths = Array.from(
    { length: previewRows },
    (_, i) => (i / (previewRows - 1)) * frame.heightMm,
  );
  const rows = levelRows(space, frame, depths);
  const capacityL = space.volumeMm3 / 1e6;

  let errorL = roundingOfCapacity * capacityL;
  if (solids.some(({ kind, solid }) => kind.curved(solid))) {
    const coarse = liquidSpace(solids, coarseFacets);
    tableRows(coarse, frame, depths).forEach(({ volumeL }, i) => {
      errorL = Math.max(errorL, Math.abs(rows[i]!.volumeL - volumeL));
    });
  }
  const pieces = piecesOf(space.mesh);
  const notice = pieces > 1 ? pieceNotice(solids, space) : null;
  const [x, y, z] = axes.map((axis) => extremes(solids, space, axis));
  const { undrainableL, trappedL, standing } = openings(document, solids, space, frame.up);
  return {
    space: shifted(space.mesh, space.origin),
    solids: document.solids.map(placedSolid).map((one) => ({
      id: one.solid.id,
      role: one.solid.role,
      ...shifted(meshOf(placedShape(one, previewFacets), space.origin), space.origin),
    })),
    extent: { low: [x![0], y![0], z![0]], high: [x![1], y![1], z![1]] },
    frame,
    capacityL,
    errorL,
    undrainableL,
    trappedL,
    standing,
    stickNotices: stickNotices(solids, space, frame),
    pieces,
    rows,
    notices: [...(notice === null ? [] : [notice]), ...wallNotices(document, solids)],
  };
}
