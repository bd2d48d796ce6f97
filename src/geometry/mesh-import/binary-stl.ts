import { meshBuilder, tooManyTriangles } from './mesh-builder';
import { meshCaps, spacedCount } from './mesh-caps';
import { MeshFileError } from './mesh-file-error';
import type { MeshReader } from './mesh-reader';

const headBytes = 84;
const recordBytes = 50;

/**
 * Binary STL: 80 bytes of anything, the count of triangles, then 50 bytes each (normal, three corners, two
 * bytes of anything), little-endian. The written normals are not used: the order of the corners counts.
 * The count is believed only as far as bytes arrive.
 *
 * @param totalBytes length of the file where it is known: then a wrong count is refused at once
 */
export function binaryStl(totalBytes: number | null): MeshReader {
  const builder = meshBuilder();
  const held = new Uint8Array(headBytes);
  let heldBytes = 0;
  let promised = -1;
  let read = 0;
  let bytesSeen = 0;

  return {
    write(bytes) {
      bytesSeen += bytes.length;
      let at = 0;
      while (at < bytes.length) {
        const wanted = promised < 0 ? headBytes : recordBytes;
        if (heldBytes === 0 && promised >= 0 && bytes.length - at >= wanted) {
          record(new DataView(bytes.buffer, bytes.byteOffset + at, recordBytes));
          at += wanted;
          continue;
        }
        const piece = bytes.subarray(at, at + wanted - heldBytes);
        held.set(piece, heldBytes);
        heldBytes += piece.length;
        at += piece.length;
        if (heldBytes < wanted) continue;
        heldBytes = 0;
        const view = new DataView(held.buffer);
        if (promised < 0) head(view.getUint32(80, true));
        else record(view);
      }
    },
    end() {
      if (promised < 0) {
        throw new MeshFileError(
          `The file is neither STL nor OBJ: ${bytesSeen} bytes are too few for a mesh.`,
        );
      }
      if (read < promised || heldBytes > 0) throw wrongCount(bytesSeen);
      return builder.mesh();
    },
  };

  function head(count: number): void {
    promised = count;
    if (totalBytes !== null && headBytes + recordBytes * count !== totalBytes) {
      throw wrongCount(totalBytes);
    }
    if (count > meshCaps.triangles) throw tooManyTriangles();
  }

  function record(view: DataView): void {
    if (read === promised) throw wrongCount(null);
    read += 1;
    const where = () => `Triangle ${read}`;
    const corner = (offset: number) =>
      builder.vertex(
        view.getFloat32(offset, true),
        view.getFloat32(offset + 4, true),
        view.getFloat32(offset + 8, true),
        where,
      );
    builder.triangle(corner(12), corner(24), corner(36));
  }

  /** `bytes`: how many there are in all; null when there are more than the count needs. */
  function wrongCount(bytes: number | null): MeshFileError {
    const holds =
      bytes === null
        ? 'has bytes for more'
        : `has ${spacedCount(bytes)} bytes, which is not what so many take`;
    return new MeshFileError(
      `The file is no whole STL or OBJ file: read as binary STL, its header says ${spacedCount(promised)} triangles, but it ${holds}.`,
    );
  }
}
