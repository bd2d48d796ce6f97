import type { Mesh } from './mesh';
import { enclosedVolume } from './mesh';
import { unionFind } from './union-find';

/** A connected part of a closed mesh. */
export interface Shell extends Mesh {
  /** mm³; negative for the inside of an enclosed void. */
  volumeMm3: number;
}

/** The connected parts of a closed mesh, each with the positions of the whole. */
export function shells(mesh: Mesh): Shell[] {
  const { positions, triangles } = mesh;
  const sets = unionFind(positions.length / 3);
  for (let n = 0; n < triangles.length; n += 3) {
    sets.join(triangles[n]!, triangles[n + 1]!);
    sets.join(triangles[n]!, triangles[n + 2]!);
  }
  const byRoot = new Map<number, number[]>();
  for (let n = 0; n < triangles.length; n += 3) {
    const root = sets.find(triangles[n]!);
    let list = byRoot.get(root);
    if (!list) byRoot.set(root, (list = []));
    list.push(triangles[n]!, triangles[n + 1]!, triangles[n + 2]!);
  }
  return [...byRoot.values()].map((list) => {
    const part = { positions, triangles: Uint32Array.from(list) };
    return { ...part, volumeMm3: enclosedVolume(part) };
  });
}
