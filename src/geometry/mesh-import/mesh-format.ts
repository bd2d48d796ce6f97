/** Formats that are read. */
export type MeshFormat = 'binary STL' | 'ASCII STL' | 'OBJ';

/** How many bytes of a file tell its format. */
export const tellingBytes = 1024;

/**
 * The format of a mesh file by its first bytes (1024, or the whole of a shorter file); null for a text that is
 * neither. Text has no control signs, which the count in the head of a binary STL always has; so a binary file
 * whose free header begins with "solid" is not mistaken for text.
 */
export function meshFormat(start: Uint8Array): MeshFormat | null {
  const first = start.subarray(0, tellingBytes);
  if (first.some((byte) => byte < 32 && (byte < 9 || byte > 13))) return 'binary STL';
  const text = new TextDecoder('latin1').decode(first).replace(/^\u00ef\u00bb\u00bf/, '');
  if (/^\s*solid(\s|$)/i.test(text)) return 'ASCII STL';
  return /^[ \t]*(#|v|vn|vt|f|o|g|s|mtllib|usemtl)([ \t]|$)/m.test(text) ? 'OBJ' : null;
}
