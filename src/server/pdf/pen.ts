import type { Face } from './fonts';
import { ink } from './ink';

export interface TextStyle {
  face?: Face;
  size: number;
  color?: string;
  align?: 'left' | 'right' | 'center';
}

/**
 * Draws words and lines on one document, and files every word in the document's structure so that it
 * can be read aloud in order. Coordinates in points from the top left; `y` of a word is its top.
 */
export class Pen {
  readonly document: PDFKit.PDFDocument;
  private readonly parents: PDFKit.PDFStructureElement[];

  constructor(document: PDFKit.PDFDocument, root: PDFKit.PDFStructureElement) {
    this.document = document;
    this.parents = [root];
  }

  /** Words drawn inside belong to one element of the document's structure. */
  within(type: string, draw: () => void, options: { alt?: string; scope?: 'Column' } = {}): void {
    const element = this.document.struct(type as never, options as never);
    this.parents.at(-1)!.add(element);
    this.parents.push(element);
    draw();
    this.parents.pop();
    element.end();
  }

  /** Lines and fills: not read aloud. */
  artifact(draw: () => void): void {
    this.document.markContent('Artifact', { type: 'Layout' });
    this.document.save();
    draw();
    this.document.restore();
    this.document.endMarkedContent();
  }

  /** One line of words; with `width` aligned inside it. Never breaks: fit it first. */
  word(text: string, x: number, y: number, style: TextStyle, width?: number): void {
    const { document } = this;
    this.take(style);
    const size = document.widthOfString(text);
    const shift =
      width === undefined || style.align === undefined || style.align === 'left'
        ? 0
        : style.align === 'right'
          ? width - size
          : (width - size) / 2;
    this.parents.at(-1)!.add(() => {
      this.use(style);
      document.text(text, x + shift, y, { lineBreak: false });
    });
  }

  /** Words on as many lines as they need. Answers their height. */
  paragraph(
    text: string,
    x: number,
    y: number,
    width: number,
    style: TextStyle,
    leading: number,
  ): number {
    const height = this.heightOf(text, width, style, leading);
    this.parents.at(-1)!.add(() => {
      this.use(style);
      this.document.text(text, x, y, {
        width,
        align: style.align ?? 'left',
        lineGap: this.gap(style, leading),
      });
    });
    return height;
  }

  /** A paragraph that is an element of its own. */
  paragraphIn(
    type: string,
    text: string,
    x: number,
    y: number,
    width: number,
    style: TextStyle,
    leading: number,
  ): number {
    let height = 0;
    this.within(type, () => {
      height = this.paragraph(text, x, y, width, style, leading);
    });
    return height;
  }

  heightOf(text: string, width: number, style: TextStyle, leading: number): number {
    this.take(style);
    return this.document.heightOfString(text, { width, lineGap: this.gap(style, leading) });
  }

  widthOf(text: string, style: TextStyle): number {
    this.take(style);
    return this.document.widthOfString(text);
  }

  /** The largest size, at most that of the style and at least `least`, at which the words fit. */
  fit(text: string, width: number, style: TextStyle, least: number): TextStyle {
    const natural = this.widthOf(text, style);
    return {
      ...style,
      size: Math.max(least, Math.min(style.size, (style.size * width) / natural)),
    };
  }

  line(
    x1: number,
    y1: number,
    x2: number,
    y2: number,
    weight: number,
    color: string = ink.full,
  ): void {
    this.document.moveTo(x1, y1).lineTo(x2, y2).lineWidth(weight).strokeColor(color).stroke();
  }

  /** Sets the face to measure with: no page is needed yet. */
  private take({ face = 'regular', size }: TextStyle): void {
    this.document.font(face).fontSize(size);
  }

  private use(style: TextStyle): void {
    this.take(style);
    this.document.fillColor(style.color ?? ink.full);
  }

  private gap(style: TextStyle, leading: number): number {
    this.take(style);
    return leading - this.document.currentLineHeight();
  }
}
