import type { ChartFigure, ChartReport, Region } from '~/domain/report/chart-report';
import { ink } from './ink';
import { fillRegion } from './patterns';
import type { Pen } from './pen';
import type { Sheet } from './sheet';

const height = 56;
const pad = 9;
/** The same box is the key to the patterns. */
const swatches: readonly (readonly [string, Region])[] = [
  ['Unusable', 'unusable'],
  ['Usable', 'usable'],
  ['Safe fill', 'headroom'],
];

/** The box of the four volumes. Answers where it ends. */
export function drawBox(pen: Pen, sheet: Sheet, report: ChartReport, top: number): number {
  const width = (sheet.right - sheet.left) / report.box.length;
  report.box.forEach((figure, index) => {
    const x = sheet.left + index * width;
    drawFigure(
      pen,
      figure,
      x + (index === 0 ? 0 : pad),
      top,
      width - (index === 0 ? pad : 2 * pad) + pad,
    );
    if (index > 0) pen.artifact(() => pen.line(x, top + 8, x, top + height - 4, 0.5, ink.line));
  });
  pen.artifact(() =>
    pen.line(sheet.left, top + height + 2, sheet.right, top + height + 2, 0.5, ink.line),
  );
  return top + height + 2;
}

function drawFigure(
  pen: Pen,
  { label, figure, plusMinus, unit, detail }: ChartFigure,
  x: number,
  top: number,
  width: number,
): void {
  const region = swatches.find(([word]) => label.startsWith(word))?.[1];
  const shift = region === undefined ? 0 : 13;
  if (region !== undefined) {
    pen.artifact(() => {
      if (region === 'headroom') {
        // safe fill is the line between usable and headroom
        fillRegion(pen.document, 'headroom', x, top + 9, 9, 4.5);
        fillRegion(pen.document, 'usable', x, top + 13.5, 9, 4.5);
        pen.line(x, top + 13.5, x + 9, top + 13.5, 0.9);
      } else {
        fillRegion(pen.document, region, x, top + 9, 9, 9);
      }
      pen.document
        .rect(x, top + 9, 9, 9)
        .lineWidth(0.5)
        .strokeColor(ink.full)
        .stroke();
    });
  }
  pen.within('P', () => {
    const labelStyle = pen.fit(label, width - shift, { size: 9, color: ink.second }, 6);
    pen.word(label, x + shift, top + 7, labelStyle);
    const big = { face: 'bold', size: 19 } as const;
    const rest = plusMinus === null ? '' : ` ± ${plusMinus} ${unit}`;
    const whole = pen.widthOf(figure, big) + pen.widthOf(rest, { size: 10 });
    const scale = Math.min(1, width / whole);
    const bigFit = { ...big, size: big.size * scale };
    pen.word(figure, x, top + 18 + 6 * (1 - scale), bigFit);
    if (rest !== '') {
      pen.word(rest, x + pen.widthOf(figure, bigFit), top + 25.6 - 3 * (1 - scale), {
        size: 10 * scale,
      });
    }
    pen.word(detail, x, top + 42, pen.fit(detail, width, { size: 8.5, color: ink.second }, 6));
  });
}
