import { loadManifold, spaceOf } from '../../geometry/manifold';
import { swollen } from '../../geometry/swollen';
import { thinPlace, type ThinPlace } from '../../geometry/thin-places';
import { thinMm } from '../../geometry/tolerance';
import { along } from '../../geometry/vec3';
import type { TankDocument } from '../tank/document';
import { placedShape, placedSolid, type PlacedSolid } from '../tank/placed-solid';
import { placedSolids } from '../tank/placed-solids';
import { DipwrightError } from '../errors';
import { facetStandOffMm } from './facet-stand-off';
import { liquidSpace, type LiquidSpace } from './liquid-space';
import { piecesOf } from './pieces';
import { publishedFacets } from './published-facets';
import { refuseUncomputable } from './refuse-uncomputable';

/** Pieces and thin places are told well enough at this fineness, whatever the table is published at. */
const mostFacets = 256;

/**
 * Why a design may not be issued, one sentence a reason; none when it may. Throws `invalid` when it cannot be
 * computed at all. Refused are a liquid space in pieces; one that is thinner than 0.01 mm, or is parted by
 * less than that, between two faces that stand parallel within 0.001 rad; and round solids that only touch:
 * whose count of pieces changes when every radius grows or shrinks by 0.01 mm and what facets stand off; with
 * outside sizes, when the wall does.
 */
export async function checkIssuable(document: TankDocument): Promise<string[]> {
  refuseUncomputable(document);
  await loadManifold();
  const solids = placedSolids(document);
  const space = liquidSpace(solids, Math.min(publishedFacets(solids), mostFacets));
  const round = solids.length > 1 && solids.some(({ kind, solid }) => kind.curved(solid));
  const reasons: string[] = [];

  const pieces = piecesOf(space.mesh);
  if (pieces > 1) {
    reasons.push(
      `The liquid space is in ${pieces} pieces that no opening joins: let the solids that hold overlap, or model one tank at a time.`,
    );
  }
  const thin =
    document.wall?.sizes === 'outside' ? thinInsideWall(document, solids, space) : thinIn(space);
  if (thin) {
    const at = thin.at.map((value) => Math.round(value * 10) / 10);
    const where = `near x ${at[0]}, y ${at[1]}, z ${at[2]}`;
    reasons.push(
      thin.what === 'film'
        ? `The liquid space is thinner than ${thinMm} mm ${where}: let what displaces reach the wall or stand clear of it.`
        : `What parts the liquid space is thinner than ${thinMm} mm ${where}: let the solids overlap or part them.`,
    );
  }
  const swollenPieces = (sign: number) =>
    document.wall?.sizes === 'outside'
      ? piecesWithOtherWall(document, solids, space, sign)
      : piecesWhenSwollen(solids, space, sign);
  if (round && [1, -1].some((sign) => swollenPieces(sign) !== pieces)) {
    reasons.push(
      'A round solid only touches another along a line: let them overlap or stand clear of each other.',
    );
  }
  return reasons;
}

function piecesWhenSwollen(
  solids: readonly PlacedSolid[],
  space: LiquidSpace,
  sign: number,
): number {
  const shapes = (role: 'holds' | 'displaces', direction: number) =>
    solids
      .filter(({ solid }) => solid.role === role)
      .map((one) => {
        const { shape, place } = placedShape(one, space.facets);
        if (!one.kind.curved(one.solid)) return { shape, place };
        const byMm = direction * (thinMm + facetStandOffMm(one, space.facets));
        return { shape: swollen(shape, byMm), place };
      });
  const mesh = spaceOf(shapes('holds', sign), shapes('displaces', -sign), space.origin);
  return piecesOf(mesh);
}

function thinIn({ mesh, origin }: LiquidSpace, only?: ThinPlace['what']): ThinPlace | null {
  const thin = thinPlace(mesh, thinMm, only);
  return thin && { ...thin, at: along(thin.at, origin, 1) };
}

/**
 * Where balls were taken off, what parts the liquid is nowhere thinner than two walls, but chords leave thin burrs on it
 * and splinters of liquid beside it. So what is too thin to part liquid is looked for among the solids as drawn, and
 * a film counts only if it is there with half and with a quarter of the facets too.
 */
function thinInsideWall(
  document: TankDocument,
  solids: readonly PlacedSolid[],
  space: LiquidSpace,
): ThinPlace | null {
  const film = thinIn(space, 'film');
  const stays = (part: number) => thinIn(liquidSpace(solids, space.facets / part), 'film') !== null;
  if (film && stays(2) && stays(4)) return film;
  const drawn = document.solids.map(placedSolid);
  return thinIn(liquidSpace(drawn, Math.min(space.facets, 128)), 'wall');
}

/** With outside sizes: the wall thinner for 1, thicker for −1; at 128 facets, which tells pieces well enough. */
function piecesWithOtherWall(
  document: TankDocument,
  solids: readonly PlacedSolid[],
  space: LiquidSpace,
  sign: number,
): number {
  const facets = Math.min(space.facets, 128);
  const byMm = thinMm + Math.max(...solids.map((one) => facetStandOffMm(one, facets)));
  const drawn = document.wall?.thickness ?? 0;
  const thickness = Math.max(drawn - sign * byMm, drawn / 2);
  try {
    const other = placedSolids({ ...document, wall: { thickness, sizes: 'outside' } });
    return piecesOf(liquidSpace(other, facets).mesh);
  } catch (error) {
    if (error instanceof DipwrightError) return 0;
    throw error;
  }
}
