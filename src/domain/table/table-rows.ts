import { horizontalAxes } from '../../geometry/horizontal-axes';
import { levels, type Mesh } from '../../geometry/mesh';
import { sweep } from '../../geometry/sweep';
import type { Vec3 } from '../../geometry/vec3';
import type { LiquidSpace } from './liquid-space';
import { meshLevels, type MeshLevels } from './mesh-levels';
import type { ReadingFrame } from './preview';
import type { TableRow } from './request';

/**
 * The table at the given readings (mm along the stick, any order, also twice), in their order; litres, cm², mm.
 * `at`: their levels, where they are known already.
 */
export function tableRows(
  space: LiquidSpace,
  frame: ReadingFrame,
  readingsMm: readonly number[],
  at: MeshLevels = meshLevels(space, frame, readingsMm),
): TableRow[] {
  const { mesh, origin, volumeMm3 } = space;
  const { up } = frame;
  const { ofReadings, ascending, rows, low: meshLow, high: meshHigh } = at;
  const swept = sweep(mesh, up, ascending);
  let firstDrop: Vec3 | undefined;

  return readingsMm.map((depthMm, i) => {
    const level = ofReadings[i]!;
    const row = rows[i]!;
    const inside = Math.min(Math.max(swept.volume[row]!, 0), volumeMm3);
    const mm3 = level === meshLow ? 0 : level === meshHigh ? volumeMm3 : inside;
    const centroid =
      mm3 > 1e-10 * volumeMm3
        ? (swept.moments.map((moment) => moment[row]! / mm3) as unknown as Vec3)
        : (firstDrop ??= lowestPlace(mesh, up, meshLow));
    return {
      depthMm,
      volumeL: mm3 / 1e6,
      surfaceCm2: Math.max(swept.surface[row]!, 0) / 100,
      centroidMm: [centroid[0] + origin[0], centroid[1] + origin[1], centroid[2] + origin[2]],
    };
  });
}

/** Where the first drop stands: the middle of the flat floor, or of the lowest corners. */
function lowestPlace({ positions, triangles }: Mesh, up: Vec3, low: number): Vec3 {
  const [e1, e2] = horizontalAxes(up);
  const mesh = { positions, triangles };
  const z = levels(mesh, up);
  const a = levels(mesh, e1);
  const b = levels(mesh, e2);
  const lowest = (vertex: number) => z[vertex]! - low < 1e-6;
  const sum: [number, number, number, number] = [0, 0, 0, 0];
  const add = (weight: number, ...vertices: number[]) => {
    sum[3] += weight;
    for (const vertex of vertices) {
      for (let i = 0; i < 3; i += 1)
        sum[i]! += (weight * positions[3 * vertex + i]!) / vertices.length;
    }
  };
  for (let n = 0; n < triangles.length; n += 3) {
    const [i, j, k] = [triangles[n]!, triangles[n + 1]!, triangles[n + 2]!];
    if (!lowest(i) || !lowest(j) || !lowest(k)) continue;
    add(Math.abs((a[j]! - a[i]!) * (b[k]! - b[i]!) - (b[j]! - b[i]!) * (a[k]! - a[i]!)), i, j, k);
  }
  if (sum[3] === 0) z.forEach((_, vertex) => lowest(vertex) && add(1, vertex));
  return [sum[0] / sum[3], sum[1] / sum[3], sum[2] / sum[3]];
}
