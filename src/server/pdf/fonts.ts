import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';

/** Faces of Source Sans 3 that prints use, embedded as subsets. */
export const faces = {
  regular: 'SourceSans3-Regular.ttf',
  semibold: 'SourceSans3-Semibold.ttf',
  bold: 'SourceSans3-Bold.ttf',
  black: 'SourceSans3-Black.ttf',
} as const;
export type Face = keyof typeof faces;

/** Registers the faces by name. The files come from the installed package, also when this code is bundled. */
export function registerFaces(document: PDFKit.PDFDocument): void {
  const folder = dirname(createRequire(import.meta.url).resolve('source-sans/package.json'));
  for (const [name, file] of Object.entries(faces)) {
    document.registerFont(name, join(folder, 'TTF', file));
  }
}
