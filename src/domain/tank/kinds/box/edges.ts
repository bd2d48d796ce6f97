import type { RoundedBox } from '../../../../geometry/rounded-box';
import { axisOrder, type Axis } from '../../../../geometry/shape';
import { thinMm } from '../../../../geometry/tolerance';
import type { Vec3 } from '../../solid';
import { sizeWords } from '../size-words';
import type { Box } from './schema';

const axes = ['x', 'y', 'z'] as const;
const sizeNames = ['length', 'width', 'height'] as const;

/**
 * A box as geometry sees it; null with sharp edges. The largest radius is that of the edges along the axis; the
 * other two make its rims. Of radii that do not fit (a draft that is looked at, never one that is computed) what fits
 * is taken.
 */
export function roundedOf({ length, width, height, edges = {} }: Box): RoundedBox | null {
  const radii = axes.map((axis) => edges[axis] ?? 0);
  const corner = Math.max(...radii);
  if (corner === 0) return null;
  const axis: Axis = axes[radii.lastIndexOf(corner)]!;
  const sizes = [length, width, height];
  const [first, second, third] = axisOrder(axis);
  const size: Vec3 = [sizes[first]!, sizes[second]!, sizes[third]!];
  const fitting = Math.min(corner, size[0] / 2, size[1] / 2);
  const rim = Math.min(Math.min(radii[first]!, radii[second]!), fitting, size[2] / 2);
  return { axis, size, corner: fitting, rim };
}

/** Radii that no ball rolls, and those that do not fit on a face. */
export function edgeFaults(solid: Box): readonly { path: readonly string[]; detail: string }[] {
  const { edges = {} } = solid;
  const radii = axes.map((axis) => edges[axis] ?? 0);
  const [least, middle, most] = [...radii].sort((one, other) => one - other) as [
    number,
    number,
    number,
  ];
  const one = middle === 0;
  if (!one && least !== middle) {
    const detail =
      'at most one of the three radii is more than 0, or two are equal and not larger than the third, as a ball rolls along the edges (all three equal: ball corners).';
    return [{ path: ['edges'], detail }];
  }
  return most === 0
    ? []
    : axes.flatMap((axis, i) => {
        const across = [0, 1, 2].filter((other) => other !== i);
        const narrow = across.reduce((a, b) =>
          solid[sizeNames[a]!] <= solid[sizeNames[b]!] ? a : b,
        );
        const room = solid[sizeNames[narrow]!] / 2;
        if (radii[i]! <= room) return [];
        const detail =
          room >= thinMm
            ? `a radius of ${sizeWords(radii[i]!)} mm does not fit: it is at most half of the ${sizeNames[narrow]!}, ${sizeWords(room)} mm.`
            : `the ${sizeNames[narrow]!} is too small to round these edges: leave them sharp.`;
        return [{ path: ['edges', axis], detail }];
      });
}
