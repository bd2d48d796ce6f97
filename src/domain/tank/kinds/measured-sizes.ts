import { valueAt } from '../value-at';
import type { Size } from './kind';

/** One length of a solid as it was measured, and the solid with it larger. */
export interface MeasuredSize<S> {
  path: readonly string[];
  sizeMm: number;
  grown(byMm: number): S;
}

/**
 * The sizes of a solid some of which are places in its outline: what is small beside a place is told by how wide
 * the whole is, since the place itself may be 0. mm
 */
export function measuredSizes<S>(
  solid: S,
  sizes: readonly Size[],
  widestMm: number,
): MeasuredSize<S>[] {
  return sizes.map(({ path, coordinate }) => {
    const value = Number(valueAt(solid, path));
    return {
      path,
      sizeMm: coordinate ? widestMm : value,
      grown: (byMm) => withSizes(solid, [path], value + byMm),
    };
  });
}

/** The solid with one value at some places of its entry. */
export function withSizes<S>(solid: S, paths: readonly (readonly string[])[], valueMm: number): S {
  return paths.reduce((one, path) => withValue(one, path, valueMm) as S, solid);
}

// copied along the path only: two stations may be given by one and the same list
function withValue(data: unknown, [key, ...rest]: readonly string[], valueMm: number): unknown {
  if (key === undefined) return valueMm;
  const value = withValue(valueAt(data, [key]), rest, valueMm);
  if (Array.isArray(data)) return data.with(Number(key), value);
  return { ...(data as object), [key]: value };
}
