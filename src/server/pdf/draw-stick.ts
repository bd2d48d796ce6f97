import type { ChartReport } from '~/domain/report/chart-report';
import { ink } from './ink';
import { fillRegion } from './patterns';
import type { Pen } from './pen';
import { spread } from './spread';

const railWidth = 22;
const numbersWidth = 30;
const labelHeight = 21;

/** The stick of the tank, upright, with its marks, its regions and the readings worth a word. */
export function drawStick(
  pen: Pen,
  { stick }: ChartReport,
  x: number,
  top: number,
  width: number,
  height: number,
): void {
  const rail = x + numbersWidth;
  const atY = (depthMm: number): number => top + height * (1 - depthMm / stick.heightMm);
  pen.artifact(() => {
    for (const { region, fromMm, toMm } of stick.regions) {
      fillRegion(pen.document, region, rail, atY(toMm), railWidth, atY(fromMm) - atY(toMm));
    }
    for (const { depthMm, weight } of stick.ticks) {
      const [length, thick] =
        weight === 'numbered' ? [10, 0.8] : weight === 'middle' ? [7, 0.5] : [4.5, 0.35];
      pen.line(rail, atY(depthMm), rail + length, atY(depthMm), thick);
    }
    pen.document.rect(rail, top, railWidth, height).lineWidth(0.9).strokeColor(ink.full).stroke();
  });
  pen.within('P', () => {
    for (const { depthMm, label } of stick.ticks) {
      if (label === null) continue;
      pen.word(label, x, atY(depthMm) - 5.3, { size: 8, align: 'right' }, numbersWidth - 4);
    }
    pen.word(
      stick.unit,
      rail,
      top - 12,
      { size: 8, color: ink.second, align: 'center' },
      railWidth,
    );
  });
  drawMarks(pen, stick.marks, rail + railWidth, atY, {
    top,
    bottom: top + height,
    right: x + width,
  });
}

function drawMarks(
  pen: Pen,
  marks: ChartReport['stick']['marks'],
  from: number,
  atY: (depthMm: number) => number,
  room: { top: number; bottom: number; right: number },
): void {
  const highestFirst = [...marks].sort((a, b) => b.depthMm - a.depthMm);
  const middles = spread(
    highestFirst.map(({ depthMm }) => atY(depthMm)),
    labelHeight + 1,
    room.top - 4,
    room.bottom + 4,
  );
  highestFirst.forEach(({ depthMm, word, volume, reading }, index) => {
    const y = atY(depthMm);
    const middle = middles[index]!;
    pen.artifact(() => {
      pen.line(from - railWidth, y, from, y, 0.9);
      pen.document.dash(1.6, { space: 1.4 });
      pen.document
        .moveTo(from, y)
        .lineTo(from + 5, y)
        .lineTo(from + 10, middle)
        .lineTo(from + 13, middle);
      pen.document.lineWidth(0.5).strokeColor(ink.full).stroke().undash();
    });
    const x = from + 16;
    const width = room.right - x;
    pen.within('P', () => {
      const strong = { face: 'semibold', size: 8.5 } as const;
      const line = `${word} ${reading}`;
      const size = pen.fit(line, width - 2, strong, 6).size;
      pen.word(`${word} `, x, middle - size * 1.25, { ...strong, size });
      const from2 = x + pen.widthOf(`${word} `, { ...strong, size });
      pen.word(reading, from2, middle - size * 1.25, { size });
      if (volume !== null) {
        pen.word(
          volume,
          x,
          middle - 0.6,
          pen.fit(volume, width, { size: 8, color: ink.second }, 6),
        );
      }
    });
  });
}
