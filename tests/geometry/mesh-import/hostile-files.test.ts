import fc from 'fast-check';
import { expect, it } from 'vitest';
import { enclosedVolume } from '~/geometry/mesh';
import { importMesh } from '~/geometry/mesh-import/import-mesh';
import { MeshFileError } from '~/geometry/mesh-import/mesh-file-error';
import { asAsciiStl, asBinaryStl, asObj, boxMesh, fineBall, inPieces } from './mesh-files';

/** Whatever the bytes are: a closed mesh of some volume, or sentences; nothing else, and soon. */
async function takenOrTold(bytes: Uint8Array, pieceSize: number): Promise<'taken' | 'told'> {
  const from = process.cpuUsage();
  try {
    const { mesh, volume, size } = await importMesh(inPieces(bytes, pieceSize));
    expect(volume).toBeGreaterThan(0);
    expect(enclosedVolume(mesh)).not.toBeNaN();
    expect([...mesh.positions, ...size].every(Number.isFinite)).toBe(true);
    expect(mesh.triangles.every((vertex) => 3 * vertex < mesh.positions.length)).toBe(true);
    return 'taken';
  } catch (error) {
    expect(error).toBeInstanceOf(MeshFileError);
    for (const sentence of (error as MeshFileError).sentences) {
      expect(sentence).toMatch(/^[A-Z0-9][^\n]{8,400}\.$/);
    }
    return 'told';
  } finally {
    const { user, system } = process.cpuUsage(from);
    expect(user + system).toBeLessThan(5e6);
  }
}

const originals = [boxMesh([900, 500, 300]), fineBall(6)].flatMap((mesh) => [
  asBinaryStl(mesh),
  asAsciiStl(mesh),
  asObj(mesh),
]);
const original = fc.integer({ min: 0, max: originals.length - 1 }).map((i) => originals[i]!);
const piece = fc.integer({ min: 1, max: 2000 });

it('any bytes', async () => {
  await fc.assert(
    fc.asyncProperty(fc.uint8Array({ maxLength: 3000 }), piece, async (bytes, size) => {
      await takenOrTold(bytes, size);
    }),
    { numRuns: 150, seed: 11 },
  );
}, 60_000);

it('files cut off anywhere: the whole of it is taken, a part never is', async () => {
  await fc.assert(
    fc.asyncProperty(
      original,
      fc.double({ min: 0, max: 1, noNaN: true }),
      piece,
      async (bytes, at, size) => {
        const length = Math.floor(at * bytes.length);
        // an OBJ has no end mark, and its last line may lose a digit that changes nothing
        if (bytes.length - length < 8) return;
        expect(await takenOrTold(bytes.subarray(0, length), size)).toBe('told');
      },
    ),
    { numRuns: 150, seed: 12 },
  );
  for (const bytes of originals) expect(await takenOrTold(bytes, 64)).toBe('taken');
}, 60_000);

it('files with bytes changed', async () => {
  const change = fc.tuple(
    fc.double({ min: 0, max: 0.999, noNaN: true }),
    fc.integer({ min: 0, max: 255 }),
  );
  let taken = 0;
  await fc.assert(
    fc.asyncProperty(
      original,
      fc.array(change, { minLength: 1, maxLength: 6 }),
      piece,
      async (bytes, changes, size) => {
        const changed = Uint8Array.from(bytes);
        for (const [at, value] of changes) changed[Math.floor(at * changed.length)] = value;
        if ((await takenOrTold(changed, size)) === 'taken') taken += 1;
      },
    ),
    { numRuns: 250, seed: 13 },
  );
  expect(taken).toBeGreaterThan(20);
}, 60_000);

it('words of the formats in any order', async () => {
  const word = fc.constantFrom(
    'solid',
    'facet',
    'outer loop',
    'vertex 1 2 3',
    'endloop',
    'endfacet',
    'endsolid',
    'v 0 0 1',
    'v 1 0 0',
    'v 0 1 0',
    'f 1 2 3',
    'f -1 -2 -3',
    'f 3 2 1 2',
    'vn 0 0 1',
    'o it',
    '#',
    '\\',
  );
  await fc.assert(
    fc.asyncProperty(fc.array(word, { maxLength: 60 }), piece, async (words, size) => {
      await takenOrTold(new TextEncoder().encode(words.join('\n')), size);
    }),
    { numRuns: 150, seed: 14 },
  );
}, 60_000);
