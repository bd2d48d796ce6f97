import type { Region } from '~/domain/report/chart-report';
import { ink } from './ink';

/** Fills a rectangle with the pattern of a region, by vector lines that a photocopy keeps. */
export function fillRegion(
  document: PDFKit.PDFDocument,
  region: Region,
  x: number,
  y: number,
  width: number,
  height: number,
): void {
  if (height <= 0.05) return;
  document.save();
  document.rect(x, y, width, height).clip();
  if (region === 'usable') document.rect(x, y, width, height).fill(ink.wash);
  if (region === 'unusable') crossHatch(document, x, y, width, height);
  if (region === 'headroom') dots(document, x, y, width, height);
  document.restore();
}

const hatch = 3.6;
const dotPitch = 4.4;

function crossHatch(
  document: PDFKit.PDFDocument,
  x: number,
  y: number,
  width: number,
  height: number,
): void {
  document.lineWidth(0.4).strokeColor(ink.second);
  // lines stand on a grid of the page, so that neighbouring pieces join
  for (let c = Math.floor((x - y - height) / hatch) * hatch; c < x + width - y; c += hatch) {
    document.moveTo(y + c, y).lineTo(y + height + c, y + height);
  }
  for (let c = Math.floor((x + y) / hatch) * hatch; c < x + width + y + height; c += hatch) {
    document.moveTo(c - y, y).lineTo(c - y - height, y + height);
  }
  document.stroke();
}

function dots(
  document: PDFKit.PDFDocument,
  x: number,
  y: number,
  width: number,
  height: number,
): void {
  for (let row = Math.floor(y / dotPitch); row * dotPitch < y + height; row += 1) {
    for (let column = Math.floor(x / dotPitch); column * dotPitch < x + width; column += 1) {
      const shift = row % 2 === 0 ? 0 : dotPitch / 2;
      document.circle(column * dotPitch + shift, row * dotPitch + dotPitch / 2, 0.5);
    }
  }
  document.fill(ink.second);
}
