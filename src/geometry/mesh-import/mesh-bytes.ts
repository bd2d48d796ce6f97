import type { Mesh } from '../mesh';

/**
 * How an accepted mesh is kept and sent: "DWMESH01", counts of vertices and triangles (32 bits each), positions
 * as doubles, triangles as 32-bit indices; little-endian throughout. The same mesh is always the same bytes.
 */
const mark = 'DWMESH01';
const headBytes = 16;

export function bytesOfMesh({ positions, triangles }: Mesh): Uint8Array<ArrayBuffer> {
  const bytes = new Uint8Array(headBytes + 8 * positions.length + 4 * triangles.length);
  const view = new DataView(bytes.buffer);
  for (let i = 0; i < mark.length; i += 1) bytes[i] = mark.charCodeAt(i);
  view.setUint32(8, positions.length / 3, true);
  view.setUint32(12, triangles.length / 3, true);
  let at = headBytes;
  for (const value of positions) {
    view.setFloat64(at, value, true);
    at += 8;
  }
  for (const vertex of triangles) {
    view.setUint32(at, vertex, true);
    at += 4;
  }
  return bytes;
}

/** The mesh again. Throws when the bytes are no whole mesh. */
export function meshOfBytes(bytes: Uint8Array): Mesh {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const marked =
    bytes.length >= headBytes && [...mark].every((sign, i) => bytes[i] === sign.charCodeAt(0));
  const vertices = marked ? view.getUint32(8, true) : 0;
  const count = marked ? view.getUint32(12, true) : 0;
  if (!marked || bytes.length !== headBytes + 24 * vertices + 12 * count) {
    throw new Error('These bytes are no whole mesh.');
  }
  const positions = new Float64Array(3 * vertices);
  const triangles = new Uint32Array(3 * count);
  const corners = headBytes + 24 * vertices;
  for (let i = 0; i < positions.length; i += 1)
    positions[i] = view.getFloat64(headBytes + 8 * i, true);
  for (let i = 0; i < triangles.length; i += 1) {
    triangles[i] = view.getUint32(corners + 4 * i, true);
    if (triangles[i]! >= vertices) throw new Error('These bytes are no whole mesh.');
  }
  return { positions, triangles };
}
