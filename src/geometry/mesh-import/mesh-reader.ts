import type { Mesh } from '../mesh';

/** Reads one format, piece by piece. Both throw a MeshFileError. */
export interface MeshReader {
  write(bytes: Uint8Array): void;
  /** After the last piece. */
  end(): Mesh;
}
