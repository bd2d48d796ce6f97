import type { Mesh } from '../mesh';
import { meshLines, type MeshLines } from '../mesh-lines';
import { unionFind } from '../union-find';
import type { Vec3 } from '../vec3';

/** A connected part of a closed mesh and whether its faces look the right way. */
export interface ShellSide {
  /** Positive when its faces look outward. In the mesh's unit, cubed. */
  volume: number;
  /** Whether it lies inside an odd number of the others: then it bounds a void and should look inward. */
  isVoid: boolean;
  /** Its highest corner. */
  top: Vec3;
}

/** Every shell of a closed mesh. O(triangles) and one line upwards a shell. */
export function shellSides(mesh: Mesh): ShellSide[] {
  const { positions, triangles } = mesh;
  const sets = unionFind(positions.length / 3);
  for (let n = 0; n < triangles.length; n += 3) {
    sets.join(triangles[n]!, triangles[n + 1]!);
    sets.join(triangles[n]!, triangles[n + 2]!);
  }
  const shells = new Map<number, { six: number; top: number }>();
  for (let n = 0; n < triangles.length; n += 3) {
    const root = sets.find(triangles[n]!);
    let shell = shells.get(root);
    if (!shell) shells.set(root, (shell = { six: 0, top: triangles[n]! }));
    shell.six += sixVolumes(positions, triangles, n);
    for (let c = 0; c < 3; c += 1) {
      if (positions[3 * triangles[n + c]! + 2]! > positions[3 * shell.top + 2]!) {
        shell.top = triangles[n + c]!;
      }
    }
  }
  let lines: MeshLines | null = null;
  return Array.from(shells, ([root, { six, top }]) => {
    const place: Vec3 = [positions[3 * top]!, positions[3 * top + 1]!, positions[3 * top + 2]!];
    const others = new Map<number, number>();
    if (shells.size > 1) {
      lines ??= meshLines(mesh, [0, 0, 1]);
      for (const { level, triangle } of lines.crossings(place)) {
        const shell = sets.find(triangles[triangle]!);
        if (level > place[2] && shell !== root) others.set(shell, (others.get(shell) ?? 0) + 1);
      }
    }
    const around = [...others.values()].filter((crossings) => crossings % 2 === 1).length;
    return { volume: six / 6, isVoid: around % 2 === 1, top: place };
  });
}

/** Six times the signed volume between a triangle and the first corner of the mesh. */
function sixVolumes(p: Float64Array, triangles: Uint32Array, n: number): number {
  const [a, b, c] = [3 * triangles[n]!, 3 * triangles[n + 1]!, 3 * triangles[n + 2]!];
  const ax = p[a]! - p[0]!;
  const ay = p[a + 1]! - p[1]!;
  const az = p[a + 2]! - p[2]!;
  const bx = p[b]! - p[0]!;
  const by = p[b + 1]! - p[1]!;
  const bz = p[b + 2]! - p[2]!;
  const cx = p[c]! - p[0]!;
  const cy = p[c + 1]! - p[1]!;
  const cz = p[c + 2]! - p[2]!;
  return ax * (by * cz - bz * cy) + ay * (bz * cx - bx * cz) + az * (bx * cy - by * cx);
}
