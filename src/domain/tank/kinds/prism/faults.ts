import { turnAt } from '../../../../geometry/rounded-outline';
import type { Vec2 } from '../../../../geometry/shape';
import { thinMm } from '../../../../geometry/tolerance';
import { profileFaults, type ProfileFault } from '../profile-faults';
import { sizeWords } from '../size-words';
import type { Prism } from './schema';

/** Corners that turn by less than this, radians, go straight on. */
const straightOn = 1e-3;

/** What a profile cannot be: see profileFaults, and corners whose radius does not fit. */
export function prismFaults({ profile }: Prism): ProfileFault[] {
  const corners = profile.map(([x, z]): Vec2 => [x, z]);
  const faults = profileFaults(corners, ['profile']);
  return faults.length > 0 ? faults : radiusFaults(profile, corners);
}

function radiusFaults(profile: Prism['profile'], corners: readonly Vec2[]): ProfileFault[] {
  const n = corners.length;
  const half = corners.map((_, i) => Math.tan(Math.abs(turnAt(corners, i)) / 2));
  const radius = (i: number) => profile[i]![2] ?? 0;
  const faults: ProfileFault[] = [];
  profile.forEach((_, i) => {
    if (radius(i) === 0) return;
    const fault = (detail: string) => faults.push({ path: ['profile', String(i), '2'], detail });
    if (Math.abs(turnAt(corners, i)) < straightOn) {
      fault(
        'the profile goes straight on here, so there is nothing to round: leave the radius out.',
      );
      return;
    }
    // a side is shared with the corner at its other end: what that one leaves, or an even radius for both
    const room = [(i + 1) % n, (i + n - 1) % n].map((j) => {
      const side = Math.hypot(corners[j]![0] - corners[i]![0], corners[j]![1] - corners[i]![1]);
      if (radius(j) === 0) return side;
      return Math.max(side - radius(j) * half[j]!, (side * half[i]!) / (half[i]! + half[j]!));
    });
    const greatest = Math.min(...room) / half[i]!;
    if (radius(i) <= greatest * (1 + 1e-12)) {
      if (reachesIntoCorner(corners, i, radius(i) * half[i]!)) {
        fault(
          'another part of the profile reaches into the rounding of this corner: make the radius smaller.',
        );
      }
      return;
    }
    // rounded down, so that what is said does fit
    const said = sizeWords(Math.floor(greatest * 1000) / 1000);
    fault(
      greatest >= thinMm
        ? `a radius of ${sizeWords(radius(i))} mm does not fit on the two sides of this corner: at most ${said} mm does.`
        : 'the sides of this corner are too short to round it: leave the radius out.',
    );
  });
  return faults;
}

/** Whether a side that does not end at corner i runs through the triangle of the corner and its points of touch. */
function reachesIntoCorner(corners: readonly Vec2[], i: number, reach: number): boolean {
  const n = corners.length;
  const corner = corners[i]!;
  const touch = ([x, y]: Vec2): Vec2 => {
    const share = reach / Math.hypot(x - corner[0], y - corner[1]);
    return [corner[0] + share * (x - corner[0]), corner[1] + share * (y - corner[1])];
  };
  const [before, after] = [touch(corners[(i + n - 1) % n]!), touch(corners[(i + 1) % n]!)];
  return corners.some((from, j) => {
    const to = corners[(j + 1) % n]!;
    return j !== i && (j + 1) % n !== i && entersTriangle(from, to, [before, after, corner]);
  });
}

/** Whether a side has more than a point, and more than an edge, in common with a triangle. */
function entersTriangle(from: Vec2, to: Vec2, triangle: readonly [Vec2, Vec2, Vec2]): boolean {
  const [a, b, c] = triangle;
  const turned = Math.sign((b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]));
  let [start, end] = [0, 1];
  for (let k = 0; k < 3; k += 1) {
    const [p, q] = [triangle[k]!, triangle[(k + 1) % 3]!];
    const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
    const inside = ([x, y]: Vec2) =>
      (turned * ((q[0] - p[0]) * (y - p[1]) - (q[1] - p[1]) * (x - p[0]))) / length - 1e-6;
    const [f, g] = [inside(from), inside(to)];
    if (f < 0 && g < 0) return false;
    if (f < 0) start = Math.max(start, f / (f - g));
    else if (g < 0) end = Math.min(end, f / (f - g));
  }
  return end > start;
}
