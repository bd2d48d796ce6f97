import type { Interval } from './intervals';
import type { Line } from './line';
import type { Mesh } from './mesh';
import { meshLines, type MeshLines } from './mesh-lines';
import { dot, type Vec3 } from './vec3';

/**
 * Looks up the stretches of a line inside a closed mesh, its surface included within about `slack` mm across
 * the line: then the lines that far beside it count too. One direction after another is prepared once and kept.
 */
export function meshChords(mesh: Mesh): (line: Line, slack: number) => Interval[] {
  let kept: { direction: Vec3; lines: MeshLines } | undefined;
  return ({ origin, direction }, slack) => {
    if (!kept || kept.direction.some((value, axis) => value !== direction[axis])) {
      kept = { direction, lines: meshLines(mesh, direction) };
    }
    const { lines } = kept;
    const start = dot(direction, origin);
    return besides(origin, direction, slack).flatMap((point) => {
      const found: Interval[] = [];
      let depth = 0;
      let from = 0;
      for (const { level, into } of lines.crossings(point)) {
        if (depth === 0 && into === 1) from = level;
        depth += into;
        if (depth === 0 && into === -1) found.push({ from: from - start, to: level - start });
      }
      return found;
    });
  };
}

function besides(origin: Vec3, direction: Vec3, slack: number): Vec3[] {
  if (!(slack > 0)) return [origin];
  const least = [0, 1, 2].reduce((best, axis) =>
    Math.abs(direction[axis]!) < Math.abs(direction[best]!) ? axis : best,
  );
  const axis = [0, 0, 0];
  axis[least] = 1;
  const [d0, d1, d2] = direction;
  const across: Vec3 = [
    d1 * axis[2]! - d2 * axis[1]!,
    d2 * axis[0]! - d0 * axis[2]!,
    d0 * axis[1]! - d1 * axis[0]!,
  ];
  const size = Math.hypot(...across);
  const other: Vec3 = [
    d1 * across[2] - d2 * across[1],
    d2 * across[0] - d0 * across[2],
    d0 * across[1] - d1 * across[0],
  ];
  const moved = (by: Vec3, sign: number): Vec3 => [
    origin[0] + (sign * slack * by[0]) / size,
    origin[1] + (sign * slack * by[1]) / size,
    origin[2] + (sign * slack * by[2]) / size,
  ];
  return [origin, moved(across, 1), moved(across, -1), moved(other, 1), moved(other, -1)];
}
