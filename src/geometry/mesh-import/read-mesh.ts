import type { Mesh } from '../mesh';
import { asciiStl } from './ascii-stl';
import { binaryStl } from './binary-stl';
import { meshCaps } from './mesh-caps';
import { MeshFileError } from './mesh-file-error';
import { meshFormat, tellingBytes, type MeshFormat } from './mesh-format';
import type { MeshReader } from './mesh-reader';
import { obj } from './obj';

/** The bytes of a file, piece by piece. */
export type Pieces = AsyncIterable<Uint8Array> | Iterable<Uint8Array>;

export interface ReadMesh {
  /** As written: equal corners are one, nothing else is mended. In the file's own numbers. */
  mesh: Mesh;
  format: MeshFormat;
}

/**
 * Reads STL (binary or text) or OBJ, told by content, piece by piece. Throws a MeshFileError with one sentence
 * that names the line or triangle for what cannot be read, and for more than 64 MB or 1 000 000 triangles.
 *
 * @param totalBytes length of the file where it is known beforehand
 */
export async function readMesh(
  pieces: Pieces,
  totalBytes: number | null = null,
): Promise<ReadMesh> {
  if (totalBytes !== null && totalBytes > meshCaps.bytes) throw tooLarge();
  let start = new Uint8Array(0);
  let reading: { reader: MeshReader; format: MeshFormat } | null = null;
  let bytes = 0;
  for await (const piece of pieces) {
    bytes += piece.length;
    if (bytes > meshCaps.bytes) throw tooLarge();
    if (reading) {
      reading.reader.write(piece);
      continue;
    }
    start = joined(start, piece);
    if (start.length < tellingBytes) continue;
    reading = begun(start, totalBytes);
    start = new Uint8Array(0);
  }
  reading ??= begun(start, totalBytes ?? bytes);
  return { mesh: reading.reader.end(), format: reading.format };
}

function begun(start: Uint8Array, totalBytes: number | null) {
  if (start.length === 0) throw new MeshFileError('The file is empty: choose an STL or OBJ file.');
  const format = meshFormat(start);
  if (format === null) {
    throw new MeshFileError('The file is neither STL nor OBJ: choose one of these.');
  }
  const reader =
    format === 'binary STL' ? binaryStl(totalBytes) : format === 'ASCII STL' ? asciiStl() : obj();
  reader.write(withoutMark(start, format));
  return { reader, format };
}

/** Text without the mark of UTF-8 that some programs begin it with. */
function withoutMark(start: Uint8Array, format: MeshFormat): Uint8Array {
  const marked = start[0] === 0xef && start[1] === 0xbb && start[2] === 0xbf;
  return marked && format !== 'binary STL' ? start.subarray(3) : start;
}

function joined(one: Uint8Array, other: Uint8Array): Uint8Array<ArrayBuffer> {
  const both = new Uint8Array(one.length + other.length);
  both.set(one);
  both.set(other, one.length);
  return both;
}

function tooLarge(): MeshFileError {
  return new MeshFileError(
    'The file is larger than 64 MB, the most that is taken: write a coarser mesh.',
  );
}
