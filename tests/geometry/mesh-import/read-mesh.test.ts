import { describe, expect, it } from 'vitest';
import { enclosedVolume } from '~/geometry/mesh';
import { meshFormat } from '~/geometry/mesh-import/mesh-format';
import { readMesh } from '~/geometry/mesh-import/read-mesh';
import { cornerTetrahedron } from '../solids';
import { asAsciiStl, asBinaryStl, asObj, boxMesh, inPieces } from './mesh-files';

const text = (...lines: string[]) => [new TextEncoder().encode(lines.join('\n'))];

describe('the same solid from every format', () => {
  // a b c / 6: a pyramid's third of half a box
  const tetrahedron = cornerTetrahedron(300, 200, 100);
  const box = boxMesh([900, 500, 300], [-100, 20, 7]);
  it.each([
    ['binary STL', asBinaryStl],
    ['binary STL', (mesh: typeof box) => asBinaryStl(mesh, 'solid of a binary file')],
    ['ASCII STL', (mesh: typeof box) => asAsciiStl(mesh)],
    ['ASCII STL', (mesh: typeof box) => asAsciiStl(mesh, '\r\n')],
    ['OBJ', asObj],
  ])('%s, whole and in pieces of any size', async (format, write) => {
    for (const [mesh, volume, vertices] of [
      [tetrahedron, (300 * 200 * 100) / 6, 4],
      [box, 900 * 500 * 300, 8],
    ] as const) {
      const bytes = write(mesh);
      for (const size of [1, 7, 49, 1000, 1e6]) {
        const read = await readMesh(inPieces(bytes, size));
        expect(read.format).toBe(format);
        expect(read.mesh.positions.length).toBe(3 * vertices);
        expect(read.mesh.triangles.length).toBe(mesh.triangles.length);
        expect(enclosedVolume(read.mesh)).toBeCloseTo(volume, 3);
      }
    }
  });
});

describe('OBJ', () => {
  const corners = [
    'v 0 0 0',
    'v 10 0 0',
    'v 10 10 0',
    'v 0 10 0',
    'v 0 0 5',
    'v 10 0 5',
    'v 10 10 5',
    'v 0 10 5',
  ];
  it('takes squares, indices from the end, every form of corner, comments, continued lines', async () => {
    const { mesh } = await readMesh(
      text(
        '\u00ef\u00bb\u00bf# a box',
        'mtllib none.mtl',
        ...corners,
        'vn 0 0 1',
        'vt 0 0',
        's off',
        'f 4 3 2 1',
        'f -4/1/1 -3/1/1 -2/1/1 -1/1/1',
        'f 1//1 2//1 \\',
        '  6//1 5//1',
        'f 2/1 3/1 7/1 6/1',
        'f 3/ 4/ 8/ 7/',
        'f 4 1 5 8   ',
      ).map((one) => Uint8Array.from(one)),
    );
    expect(mesh.triangles.length / 3).toBe(12);
    expect(enclosedVolume(mesh)).toBeCloseTo(500, 9);
  });

  it('cuts a face that is not convex ear by ear: an L of 3 squares by 5 has 1500', async () => {
    const outline = [
      [0, 0],
      [20, 0],
      [20, 10],
      [10, 10],
      [10, 20],
      [0, 20],
    ] as const;
    const { mesh } = await readMesh(
      text(
        ...outline.map(([x, y]) => `v ${x} ${y} 0`),
        ...outline.map(([x, y]) => `v ${x} ${y} 5`),
        // begins where a fan would leave the outline
        'f 3 2 1 6 5 4',
        'f 9 10 11 12 7 8',
        ...outline.map((_, i) => `f ${i + 1} ${((i + 1) % 6) + 1} ${((i + 1) % 6) + 7} ${i + 7}`),
      ),
    );
    expect(enclosedVolume(mesh)).toBeCloseTo(1500, 9);
    // every triangle of the floor looks down: none is folded over
    const { positions: p, triangles: t } = mesh;
    for (let n = 0; n < t.length; n += 3) {
      const [a, b, c] = [3 * t[n]!, 3 * t[n + 1]!, 3 * t[n + 2]!];
      const up =
        (p[b]! - p[a]!) * (p[c + 1]! - p[a + 1]!) - (p[b + 1]! - p[a + 1]!) * (p[c]! - p[a]!);
      if (p[a + 2] === 0 && p[b + 2] === 0 && p[c + 2] === 0) expect(up).toBeLessThan(0);
    }
  });

  it.each([
    [['v 0 0'], 'Line 1: a vertex has three numbers, not "v 0 0".'],
    [['v 0 0 nan'], 'Line 1: a vertex has three numbers, not "v 0 0 nan".'],
    [['v 0 0 0x10'], 'Line 1: a vertex has three numbers, not "v 0 0 0x10".'],
    [['v 0 0 1e400'], 'Line 1: a coordinate is a number within ± 1 000 000 000, not Infinity.'],
    [['v 0 0 0', 'f 1 2 3'], 'Line 2: there is no vertex 2 before this face: 1 were given.'],
    [['v 0 0 0', 'f 0 1 1'], 'Line 2: there is no vertex 0 before this face: 1 were given.'],
    [['v 0 0 0', 'f -2 1 1'], 'Line 2: there is no vertex -2 before this face: 1 were given.'],
    [['v 0 0 0', 'f 1 1'], 'Line 2: a face has at least three corners.'],
    [['v 0 0 0', '', 'f 1 one 1'], 'Line 3: "one" is no corner of a face.'],
  ])('%j is refused', async (lines, sentence) => {
    await expect(readMesh(text(...lines))).rejects.toThrow(sentence);
  });
});

describe('OBJ faces and lines past what is taken', () => {
  const star = (points: number) =>
    Array.from({ length: 2 * points }, (_, i) => {
      const radius = i % 2 === 0 ? 10 : 4;
      return `v ${radius * Math.cos((i * Math.PI) / points)} ${radius * Math.sin((i * Math.PI) / points)} 0`;
    });
  const face = (corners: number) =>
    `f ${Array.from({ length: corners }, (_, i) => i + 1).join(' ')}`;

  it('a star of 64 corners is cut, one of 66 refused', async () => {
    expect((await readMesh(text(...star(32), face(64)))).mesh.triangles.length / 3).toBe(62);
    await expect(readMesh(text(...star(33), face(66)))).rejects.toThrow(
      'Line 67: a face of 66 corners cannot be cut into triangles, since it is not convex and has more than 64, or crosses itself: write the mesh in triangles.',
    );
  });

  it('a line of 70 000 signs', async () => {
    await expect(readMesh(text(`v ${'0'.repeat(70_000)} 0 0`))).rejects.toThrow(
      'Line 1: a line has at most 65 536 signs.',
    );
  });
});

describe('STL', () => {
  it.each([
    [
      ['solid', 'facet normal 0 0 1', 'outer loop', 'vertex 1 2'],
      'Line 4: a vertex has three numbers, not "vertex 1 2".',
    ],
    [
      ['solid', 'outer loop', 'vertex 1 2 3', 'endloop'],
      'Line 4: a triangle has three corners, not fewer.',
    ],
    [['solid', 'vertex 1 2 3'], 'Line 2: a vertex stands inside "outer loop".'],
    [
      ['solid', 'outer loop', ...Array.from({ length: 4 }, (_, i) => `vertex ${i} 0 0`)],
      'Line 6: a triangle has three corners, not more.',
    ],
    [['solid', 'hello there'], 'Line 2: "hello there" means nothing in an STL file.'],
    [
      ['solid', 'facet normal 0 0 1', 'outer loop'],
      'The file ends before its "endsolid": it was cut off.',
    ],
  ])('%j is refused', async (lines, sentence) => {
    await expect(readMesh(text(...lines))).rejects.toThrow(sentence);
  });

  it('names the triangle of a number that is none', async () => {
    const bytes = asBinaryStl(boxMesh([1, 1, 1]));
    new DataView(bytes.buffer).setFloat32(84 + 50 * 4 + 12, NaN, true);
    await expect(readMesh([bytes])).rejects.toThrow(/^Triangle 5: a coordinate is a number/);
  });

  it('refuses a file that is neither', async () => {
    await expect(readMesh([])).rejects.toThrow('The file is empty');
    await expect(readMesh(text('<html>'))).rejects.toThrow('The file is neither STL nor OBJ');
    await expect(readMesh([Uint8Array.of(0, 1, 2)])).rejects.toThrow('neither STL nor OBJ');
    expect(meshFormat(asBinaryStl(boxMesh([1, 1, 1]), 'solid facet v f'))).toBe('binary STL');
  });
});

describe('caps', () => {
  const lying = (count: number, bytes = 684) => {
    const file = new Uint8Array(bytes);
    new DataView(file.buffer).setUint32(80, count, true);
    return file;
  };

  it('takes no memory for a header that lies', async () => {
    const before = process.memoryUsage();
    for (let run = 0; run < 200; run += 1) {
      await expect(readMesh([lying(0xffff_ffff)])).rejects.toThrow(
        'its header says 4 294 967 295 triangles, but it has 684 bytes',
      );
      // the length is not known beforehand: a count within the cap is believed no further than the bytes go
      await expect(readMesh(inPieces(lying(999_999, 20_084), 5000))).rejects.toThrow(
        'its header says 999 999 triangles, but it has 20 084 bytes',
      );
    }
    const after = process.memoryUsage();
    // 200 times 4 billion triangles would be 40 TB, 999 999 of them 10 GB
    const grown = after.arrayBuffers - before.arrayBuffers + after.rss - before.rss;
    expect(grown).toBeLessThan(150e6);
  });

  it('refuses a header that says too little or too much', async () => {
    for (const count of [11, 13]) {
      const bytes = asBinaryStl(boxMesh([1, 1, 1]));
      new DataView(bytes.buffer).setUint32(80, count, true);
      await expect(readMesh([bytes])).rejects.toThrow(`its header says ${count} triangles`);
      await expect(readMesh(inPieces(bytes, 3))).rejects.toThrow(
        `its header says ${count} triangles`,
      );
    }
  });

  it('refuses more than a million triangles before they are read', async () => {
    let pulled = 0;
    const pieces = (function* () {
      const head = lying(1_000_001, 2048);
      for (; ; pulled += 1) yield pulled === 0 ? head : new Uint8Array(2048);
    })();
    await expect(readMesh(pieces)).rejects.toThrow('more than 1 000 000 triangles');
    expect(pulled).toBe(0);
  });

  it('refuses more than 64 MB, at once where the length is known', async () => {
    let pulled = 0;
    const comment = new TextEncoder().encode(`# ${'x'.repeat(1021)}\n`.repeat(1024));
    const endless = (function* () {
      for (; ; pulled += 1) yield comment;
    })();
    await expect(readMesh(endless)).rejects.toThrow('larger than 64 MB');
    expect(pulled).toBe(64);
    await expect(readMesh(endless, 65 * 1024 * 1024)).rejects.toThrow('larger than 64 MB');
    expect(pulled).toBe(64);
  });
});
