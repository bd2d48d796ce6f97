/**
 * Edges of a triangle mesh that are not shared by exactly two faces that run along it opposite ways. An edge is
 * given as the place in `triangles` of the corner it starts from.
 */
export interface EdgeFaults {
  /** Edges of one face only: the rim of a hole. */
  open: Uint32Array;
  /** Edges of two faces that look opposite ways. */
  turned: Uint32Array;
  /** Edges of more than two faces. */
  crowded: Uint32Array;
}

/** O(triangles), by a hash of the two ends. No triangle may use one vertex twice. */
export function edgeFaults(triangles: Uint32Array): EdgeFaults {
  const size = 2 ** Math.max(4, Math.ceil(Math.log2(triangles.length + 1)) + 1);
  const firstEdge = new Int32Array(size);
  const along = new Uint8Array(size);
  const against = new Uint8Array(size);
  const seed = Math.floor(Math.random() * 2 ** 32) | 1;

  for (let n = 0; n < triangles.length; n += 1) {
    const from = triangles[n]!;
    const to = endOf(triangles, n);
    const low = Math.min(from, to);
    const high = Math.max(from, to);
    let hash = Math.imul(low ^ seed, 0x9e3779b1);
    hash = Math.imul(hash ^ (hash >>> 15) ^ high, 0x85ebca6b);
    let slot = (hash ^ (hash >>> 13)) & (size - 1);
    for (;;) {
      const known = firstEdge[slot]! - 1;
      if (known < 0) {
        firstEdge[slot] = n + 1;
        break;
      }
      const one = triangles[known]!;
      const other = endOf(triangles, known);
      if (Math.min(one, other) === low && Math.max(one, other) === high) break;
      slot = (slot + 1) & (size - 1);
    }
    const counts = from === low ? along : against;
    if (counts[slot]! < 255) counts[slot]! += 1;
  }

  const faults: Record<keyof EdgeFaults, number[]> = { open: [], turned: [], crowded: [] };
  for (let slot = 0; slot < size; slot += 1) {
    const [one, other] = [along[slot]!, against[slot]!];
    if (one + other === 0 || (one === 1 && other === 1)) continue;
    const kind = one + other === 1 ? 'open' : one + other === 2 ? 'turned' : 'crowded';
    faults[kind].push(firstEdge[slot]! - 1);
  }
  return {
    open: Uint32Array.from(faults.open),
    turned: Uint32Array.from(faults.turned),
    crowded: Uint32Array.from(faults.crowded),
  };
}

/** The vertex that the edge which starts at this place of `triangles` leads to. */
export function endOf(triangles: Uint32Array, n: number): number {
  return triangles[n % 3 === 2 ? n - 2 : n + 1]!;
}
