import { farCaps } from './far-caps';
import type { CapToGlue } from './glued-caps';
import type { PlacedShape } from './placed-shape';
import { toOwn, toTank } from './placing';
import { boundsOf, cornersOf, shapeBounds } from './shape-bounds';

/** Shapes whose far caps are cut off, and the caps that belong back on the result. */
export interface CutCaps {
  holds: readonly PlacedShape[];
  displaces: readonly PlacedShape[];
  caps: readonly CapToGlue[];
}

/**
 * Every turned shape without its far caps (far-caps.ts). Those of what displaces lie in no solid that holds, so
 * they are left off for good. null when there are none.
 */
export function cutCaps(
  holds: readonly PlacedShape[],
  displaces: readonly PlacedShape[],
): CutCaps | null {
  const all = [...holds, ...displaces];
  if (!all.some(({ shape }) => shape.form === 'revolution')) return null;
  const bounds = all.map(({ shape }) => shapeBounds(shape));
  const corners = all.map(({ place }, i) => cornersOf(bounds[i]!).map((own) => toTank(place, own)));
  const caps: CapToGlue[] = [];
  let cut = false;
  const rest = all.map((one, i): PlacedShape => {
    const { shape, place } = one;
    if (shape.form !== 'revolution') return one;
    const others = corners
      .filter((_, other) => other !== i)
      .map((points) => boundsOf(points.flatMap((point) => toOwn(place, point))));
    const far = farCaps(shape, bounds[i]!, others);
    if (!far) return one;
    cut = true;
    if (i < holds.length) for (const profile of far.caps) caps.push({ shape, profile, place });
    return { shape: far.rest, place };
  });
  return cut
    ? { holds: rest.slice(0, holds.length), displaces: rest.slice(holds.length), caps }
    : null;
}
