import { crossingSides } from '../../../geometry/outline-crossing';
import type { Vec2 } from '../../../geometry/shape';
import { thinMm } from '../../../geometry/tolerance';

export interface ProfileFault {
  path: readonly string[];
  detail: string;
}

/**
 * What a flat profile cannot be, whatever its kind: two points one after the other in one place, all on one line,
 * sides that cross or touch. `path` leads to the profile; its points count from 1 in the sentences.
 */
export function profileFaults(corners: readonly Vec2[], path: readonly string[]): ProfileFault[] {
  const n = corners.length;
  const different = new Set(corners.map(([a, b]) => `${a + 0} ${b + 0}`)).size;
  if (different < 3) return [{ path, detail: 'a profile has at least three different points.' }];
  const together = corners.flatMap((corner, i): ProfileFault[] => {
    const before = corners[(i + n - 1) % n]!;
    if (Math.hypot(corner[0] - before[0], corner[1] - before[1]) >= thinMm) return [];
    const detail = `this point lies less than ${thinMm} mm from the one before it: leave one of them out.`;
    return [{ path: [...path, String(i)], detail }];
  });
  if (together.length > 0) return together;
  if (thickness(corners) < thinMm) {
    return [{ path, detail: 'all points of the profile lie on one line: it encloses no area.' }];
  }
  const crossing = crossingSides(corners);
  if (!crossing) return [];
  const [one, other] = crossing.map((i) => `from point ${i + 1} to point ${((i + 1) % n) + 1}`);
  const detail = `the side ${one} and the side ${other} cross or touch each other: give the points once round, so that no sides meet but neighbours at their corner.`;
  return [{ path, detail }];
}

/** Greatest distance of a corner from the line through the first and the one farthest from it, mm. */
function thickness(corners: readonly Vec2[]): number {
  const [x0, y0] = corners[0]!;
  const [dx, dy] = corners
    .map(([x, y]) => [x - x0, y - y0] as const)
    .reduce((far, one) => (Math.hypot(...one) > Math.hypot(...far) ? one : far));
  const length = Math.hypot(dx, dy);
  return Math.max(...corners.map(([x, y]) => Math.abs(dx * (y - y0) - dy * (x - x0)) / length));
}
