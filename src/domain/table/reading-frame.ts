import { upVector } from '../../geometry/attitude';
import { snap, samePlaceMm } from '../../geometry/tolerance';
import { dot } from '../../geometry/vec3';
import { invalid } from '../errors';
import type { TankDocument } from '../tank/document';
import type { PlacedSolid } from '../tank/placed-solid';
import { columnAt } from './column';
import { extremes } from './extremes';
import type { LiquidSpace } from './liquid-space';
import type { ReadingFrame } from './preview';

/**
 * How readings become levels for a design as it stands. Floor and roof at the stick come from closed form.
 * So do the lowest and highest point of the whole space, unless what displaces cuts them off: then they are
 * the mesh's own, exact for flat faces. Throws `invalid` when the stick does not stand over the liquid space.
 */
export function readingFrame(
  document: TankDocument,
  solids: readonly PlacedSolid[],
  space: LiquidSpace,
): ReadingFrame {
  const up = upVector(document.attitude?.pitch ?? 0, document.attitude?.roll ?? 0);
  const [lowestLevelMm, highestLevelMm] = extremes(solids, space, up);
  if (!document.stick) {
    return {
      up,
      zeroLevelMm: lowestLevelMm,
      levelPerReading: 1,
      heightMm: tidy(highestLevelMm - lowestLevelMm),
      stick: null,
      lowestLevelMm,
      highestLevelMm,
    };
  }
  const stick = stickOf(document.stick, solids);
  return {
    up,
    zeroLevelMm: dot(up, [stick.at[0], stick.at[1], stick.zeroZ]),
    levelPerReading: up[2],
    heightMm: tidy(stick.roofZ - stick.zeroZ),
    stick,
    lowestLevelMm,
    highestLevelMm,
  };
}

function stickOf({ at, zero }: NonNullable<TankDocument['stick']>, solids: readonly PlacedSolid[]) {
  const [x, y] = at;
  const column = columnAt(solids, x, y);
  if (column.length === 0) {
    throw invalid(
      '/stick/at',
      `The stick does not stand over the liquid space: there is none at x ${x}, y ${y}. Move the stick.`,
    );
  }
  // the stick meets the lowest stretch of liquid space that reaches above its zero
  const open = column.find(({ to }) => zero === undefined || to > zero + samePlaceMm);
  if (!open) {
    const roof = tidy(column.at(-1)!.to);
    throw invalid(
      '/stick/zero',
      `The zero of the stick lies at z ${zero}, not below the roof there at z ${roof}. Lower it.`,
    );
  }
  return { at: [x, y] as const, zeroZ: zero ?? tidy(open.from), roofZ: tidy(open.to) };
}

/** Rounding of a place that lies on the snapping grid is taken off, so that 240 mm reads 240. */
function tidy(mm: number): number {
  const near = snap(mm);
  return Math.abs(near - mm) < 1e-9 ? near : mm;
}
