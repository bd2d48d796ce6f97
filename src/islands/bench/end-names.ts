import type { Which } from '~/scene/cylinder-ends';

const names = {
  x: ['left', 'right'],
  y: ['near', 'far'],
  z: ['bottom', 'top'],
} as const;

/**
 * What an end of a cylinder is called: as the side view shows it, with the end of the axis that it is in the list;
 * by its axis alone once the solid is turned.
 */
export function endName(axis: 'x' | 'y' | 'z', which: Which, turned: boolean): string {
  const low = which === 0 ? 'low' : 'high';
  return turned
    ? `${low} ${axis} end, before turning`
    : `${names[axis][which]} end (${low} ${axis})`;
}
