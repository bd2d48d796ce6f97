import type { ChartNote, ChartReport } from '~/domain/report/chart-report';
import { ink } from './ink';
import type { Pen } from './pen';
import type { Sheet } from './sheet';

const gap = 18;
const style = { size: 8, color: ink.full } as const;
const leading = 9.9;
const titleHeight = 13;
const tradeStyle = { face: 'bold', size: 9 } as const;
const tradeLeading = 11.5;

/** Height that the notes and the trade sentence need at the foot of the first page. */
export function notesHeight(pen: Pen, sheet: Sheet, report: ChartReport): number {
  const widths = noteWidths(pen, sheet, report.notes);
  const tallest = Math.max(...report.notes.map((note, i) => noteHeight(pen, note, widths[i]!)));
  return (
    8 +
    tallest +
    4 +
    pen.heightOf(report.trade, sheet.right - sheet.left, tradeStyle, tradeLeading) +
    4
  );
}

export function drawNotes(pen: Pen, sheet: Sheet, report: ChartReport, top: number): void {
  const widths = noteWidths(pen, sheet, report.notes);
  pen.artifact(() => pen.line(sheet.left, top, sheet.right, top, 0.5, ink.line));
  let x = sheet.left;
  let tallest = 0;
  report.notes.forEach((note, index) => {
    drawNote(pen, note, x, top + 7, widths[index]!);
    tallest = Math.max(tallest, noteHeight(pen, note, widths[index]!));
    x += widths[index]! + gap;
  });
  pen.paragraphIn(
    'P',
    report.trade,
    sheet.left,
    top + 8 + tallest + 4,
    sheet.right - sheet.left,
    tradeStyle,
    tradeLeading,
  );
}

function drawNote(
  pen: Pen,
  { title, caution, sentences }: ChartNote,
  x: number,
  top: number,
  width: number,
): void {
  if (caution) pen.artifact(() => drawSign(pen, x, top + 1.6));
  pen.within('H3', () => pen.word(title, x + (caution ? 14 : 0), top, { face: 'bold', size: 9 }));
  let y = top + titleHeight;
  for (const sentence of sentences) {
    y += pen.paragraphIn('P', sentence, x, y, width, style, leading) + 1.6;
  }
}

function noteHeight(pen: Pen, { sentences }: ChartNote, width: number): number {
  return sentences.reduce(
    (sum, sentence) => sum + pen.heightOf(sentence, width, style, leading) + 1.6,
    titleHeight,
  );
}

/** Columns as wide as their words ask for, so that they end at about the same height. */
function noteWidths(pen: Pen, sheet: Sheet, notes: readonly ChartNote[]): number[] {
  const room = sheet.right - sheet.left - gap * (notes.length - 1);
  let widths = notes.map(() => room / notes.length);
  for (let turn = 0; turn < 4; turn += 1) {
    const areas = notes.map((note, i) => noteHeight(pen, note, widths[i]!) * widths[i]!);
    const total = areas.reduce((sum, area) => sum + area, 0);
    widths = areas.map((area, i) => (widths[i]! + (room * area) / total) / 2);
  }
  const sum = widths.reduce((all, each) => all + each, 0);
  return widths.map((each) => (each * room) / sum);
}

/** A triangle with a stroke and a point in it: care is needed, said without colour. */
function drawSign(pen: Pen, x: number, top: number): void {
  const { document } = pen;
  document
    .moveTo(x + 5, top)
    .lineTo(x + 10, top + 8.6)
    .lineTo(x, top + 8.6)
    .closePath();
  document.fill(ink.full);
  document
    .moveTo(x + 5, top + 2.8)
    .lineTo(x + 5, top + 5.8)
    .lineWidth(1)
    .strokeColor(ink.paper)
    .stroke();
  document.circle(x + 5, top + 7.2, 0.6).fill(ink.paper);
}
