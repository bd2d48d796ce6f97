import type { Mesh } from '~/geometry/mesh';
import type { Vec3 } from '~/geometry/vec3';

/** Meshes written as files by an independent few lines, so that the readers are not held against themselves. */
export function corner({ positions }: Mesh, vertex: number): Vec3 {
  return [positions[3 * vertex]!, positions[3 * vertex + 1]!, positions[3 * vertex + 2]!];
}

export function asBinaryStl(mesh: Mesh, head = 'made for a test'): Uint8Array {
  const count = mesh.triangles.length / 3;
  const bytes = new Uint8Array(84 + 50 * count);
  bytes.set(new TextEncoder().encode(head.padEnd(80)).subarray(0, 80));
  const view = new DataView(bytes.buffer);
  view.setUint32(80, count, true);
  mesh.triangles.forEach((vertex, n) => {
    const at = 84 + 50 * Math.floor(n / 3) + 12 + 12 * (n % 3);
    corner(mesh, vertex).forEach((value, axis) => view.setFloat32(at + 4 * axis, value, true));
  });
  return bytes;
}

export function asAsciiStl(mesh: Mesh, newLine = '\n'): Uint8Array {
  const lines = ['solid made for a test'];
  for (let n = 0; n < mesh.triangles.length; n += 3) {
    lines.push(' facet normal 0 0 0', '  outer loop');
    for (let c = 0; c < 3; c += 1) {
      lines.push(`   vertex ${corner(mesh, mesh.triangles[n + c]!).join(' ')}`);
    }
    lines.push('  endloop', ' endfacet');
  }
  return new TextEncoder().encode([...lines, 'endsolid', ''].join(newLine));
}

export function asObj(mesh: Mesh): Uint8Array {
  const lines = ['# made for a test', 'o tank'];
  for (let vertex = 0; vertex < mesh.positions.length / 3; vertex += 1) {
    lines.push(`v ${corner(mesh, vertex).join(' ')}`);
  }
  for (let n = 0; n < mesh.triangles.length; n += 3) {
    lines.push(`f ${[0, 1, 2].map((c) => mesh.triangles[n + c]! + 1).join(' ')}`);
  }
  return new TextEncoder().encode(lines.join('\n'));
}

/** Cut into pieces of so many bytes. */
export function* inPieces(bytes: Uint8Array, size: number): Generator<Uint8Array> {
  for (let at = 0; at < bytes.length; at += size) yield bytes.subarray(at, at + size);
}

/** A box with its lowest corner at `at`, faces outward. */
export function boxMesh([x, y, z]: Vec3, at: Vec3 = [0, 0, 0]): Mesh {
  const corners = [0, 1, 2, 3, 4, 5, 6, 7].flatMap((i) => [
    at[0] + (i & 1 ? x : 0),
    at[1] + (i & 2 ? y : 0),
    at[2] + (i & 4 ? z : 0),
  ]);
  const squares = [
    [0, 2, 3, 1],
    [4, 5, 7, 6],
    [0, 1, 5, 4],
    [2, 6, 7, 3],
    [0, 4, 6, 2],
    [1, 3, 7, 5],
  ];
  return {
    positions: Float64Array.from(corners),
    triangles: Uint32Array.from(squares.flatMap(([a, b, c, d]) => [a!, b!, c!, a!, c!, d!])),
  };
}

export function turnedOver({ positions, triangles }: Mesh): Mesh {
  return {
    positions,
    triangles: triangles.map((_, n) => triangles[n - (n % 3) + [0, 2, 1][n % 3]!]!),
  };
}

export function together(...meshes: Mesh[]): Mesh {
  let before = 0;
  const triangles = meshes.flatMap(({ positions, triangles: own }) => {
    const moved = Array.from(own, (vertex) => vertex + before);
    before += positions.length / 3;
    return moved;
  });
  return {
    positions: Float64Array.from(meshes.flatMap(({ positions }) => [...positions])),
    triangles: Uint32Array.from(triangles),
  };
}

/** A ball of the radius 1000 about the origin with 2·n·(n−1) triangles, corners on the sphere, rounded to 32 bits. */
export function fineBall(n: number): Mesh {
  const rows = n - 1;
  const positions = new Float64Array(3 * (rows * n + 2));
  positions.set([0, 0, 1000]);
  positions.set([0, 0, -1000], positions.length - 3);
  for (let row = 0; row < rows; row += 1) {
    const polar = (Math.PI * (row + 1)) / n;
    for (let i = 0; i < n; i += 1) {
      const around = (2 * Math.PI * i) / n;
      const place = [
        1000 * Math.sin(polar) * Math.cos(around),
        1000 * Math.sin(polar) * Math.sin(around),
        1000 * Math.cos(polar),
      ].map(Math.fround);
      positions.set(place, 3 * (1 + row * n + i));
    }
  }
  const at = (row: number, i: number) =>
    row < 0 ? 0 : row === rows ? rows * n + 1 : 1 + row * n + (i % n);
  const triangles: number[] = [];
  for (let row = -1; row < rows; row += 1) {
    for (let i = 0; i < n; i += 1) {
      if (row >= 0) triangles.push(at(row, i), at(row + 1, i), at(row, i + 1));
      if (row < rows - 1 && row >= -1) {
        if (row === -1) triangles.push(0, at(0, i), at(0, i + 1));
        else triangles.push(at(row, i + 1), at(row + 1, i), at(row + 1, i + 1));
      }
    }
  }
  return { positions, triangles: Uint32Array.from(triangles) };
}
