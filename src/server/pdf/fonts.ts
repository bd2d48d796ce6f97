import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import PDFDocument from 'pdfkit';

/** Faces of Source Sans 3 that prints use, embedded as subsets. */
export const faces = {
  regular: 'SourceSans3-Regular.ttf',
  semibold: 'SourceSans3-Semibold.ttf',
  bold: 'SourceSans3-Bold.ttf',
  black: 'SourceSans3-Black.ttf',
} as const;
export type Face = keyof typeof faces;

type OpenedFont = PDFKit.Mixins.PDFFontSource;
let opened: Map<string, OpenedFont> | undefined;

/** Registers the faces by name. The files come from the installed package, also when this code is bundled. */
export function registerFaces(document: PDFKit.PDFDocument): void {
  opened ??= openFaces();
  for (const [name, font] of opened) document.registerFont(name, font);
}

/**
 * Reading the tables of a face takes longer than drawing a page with it, so every face is opened once
 * for all prints. A document takes an opened font as its source and makes its own subset of it.
 */
function openFaces(): Map<string, OpenedFont> {
  const folder = dirname(createRequire(import.meta.url).resolve('source-sans/package.json'));
  const opener = new PDFDocument({ autoFirstPage: false });
  return new Map(
    Object.entries(faces).map(([name, file]) => {
      opener.font(join(folder, 'TTF', file));
      return [name, (opener as unknown as { _font: { font: OpenedFont } })._font.font];
    }),
  );
}
