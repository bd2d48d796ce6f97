import type { Mesh } from '../../geometry/mesh';
import { shells } from '../../geometry/shells';
import { dustOfCapacity } from '../../geometry/tolerance';

/** How many separate chambers a liquid space has; bits below 1e-9 of it are rounding and do not count. */
export function piecesOf(mesh: Mesh): number {
  const parts = shells(mesh).map(({ volumeMm3 }) => volumeMm3);
  const whole = parts.reduce((sum, volume) => sum + volume, 0);
  return parts.filter((volume) => volume > dustOfCapacity * whole).length;
}
