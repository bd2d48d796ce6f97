/** What a mesh file may be at most; checked as it is read, before memory is taken for it. */
export const meshCaps = {
  bytes: 64 * 1024 * 1024,
  triangles: 1_000_000,
  /** Different places. A closed mesh has half as many as triangles; a soup of loose ones up to thrice. */
  vertices: 3_000_000,
  /** Lines of a text file: a million triangles take about two million in OBJ, 64 MB of text STL five. */
  lines: 6_000_000,
  /** Of one line of a text file. */
  lineSigns: 65_536,
  /** Corners of a face that is not convex. */
  concaveCorners: 64,
  /** Greatest number in the file, either way. */
  number: 1e9,
} as const;

/** 1 000 000 as a person reads it. */
export function spacedCount(count: number): string {
  return String(count).replace(/\B(?=(\d{3})+$)/g, ' ');
}
