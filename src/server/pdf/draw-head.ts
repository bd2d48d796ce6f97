import type { ChartReport } from '~/domain/report/chart-report';
import { ink } from './ink';
import type { Pen } from './pen';
import type { Sheet } from './sheet';

/** The head of the first page: the liquid, biggest; whose tank; the units in words. Answers where it ends. */
export function drawHead(pen: Pen, sheet: Sheet, report: ChartReport): number {
  const width = sheet.right - sheet.left;
  let y = sheet.top;
  if (report.superseded !== null) y = drawSuperseded(pen, sheet, report.superseded, y);
  const unitsWidth = 150;
  const name = pen.fit(report.liquid, width - unitsWidth - 16, { face: 'black', size: 54 }, 24);
  // the box of a line is taller than its letters: lift it so that the capitals stand at the margin
  const capTop = y - name.size * 0.3;
  pen.within('H1', () => pen.word(report.liquid, sheet.left - name.size * 0.045, capTop, name));
  const baseline = capTop + name.size * 0.984;
  drawUnits(pen, sheet, report, y, unitsWidth);
  y = Math.max(baseline + 9, y + 46);
  y += pen.paragraphIn('H2', report.tank, sheet.left, y, width, { face: 'semibold', size: 15 }, 18);
  const where = `${report.installation} · ${report.workshop}`;
  y += pen.paragraphIn('P', where, sheet.left, y, width, { size: 11, color: ink.second }, 14);
  return drawRule(pen, sheet, y + 5, 1.4);
}

/** The head of a further page, in one line where names allow. */
export function drawFurtherHead(pen: Pen, sheet: Sheet, report: ChartReport): number {
  let y = sheet.top;
  if (report.superseded !== null) y = drawSuperseded(pen, sheet, report.superseded, y);
  const width = sheet.right - sheet.left;
  const name = pen.fit(report.liquid, width * 0.4, { face: 'black', size: 22 }, 12);
  pen.within('P', () => pen.word(report.liquid, sheet.left, y - name.size * 0.3, name));
  const from = sheet.left + pen.widthOf(report.liquid, name) + 14;
  const what = `${report.tank} · ${report.installation} · ${report.revision} · depth in ${report.lengthWords}, volume in ${report.volumeWords}`;
  const height = pen.paragraphIn(
    'P',
    what,
    from,
    y + 1.5,
    sheet.right - from,
    { size: 9, align: 'right', color: ink.second },
    11.5,
  );
  return drawRule(pen, sheet, y + Math.max(23, height + 7), 1.4);
}

function drawUnits(pen: Pen, sheet: Sheet, report: ChartReport, y: number, width: number): void {
  const x = sheet.right - width;
  pen.within('P', () => {
    (
      [
        ['depth in ', report.lengthWords],
        ['volume in ', report.volumeWords],
      ] as const
    ).forEach(([lead, unit], line) => {
      const strong = { face: 'bold', size: 12.5 } as const;
      const light = { size: 12.5 } as const;
      const top = y - 4 + line * 15.5;
      const start = sheet.right - pen.widthOf(lead, light) - pen.widthOf(unit, strong);
      pen.word(lead, start, top, light);
      pen.word(unit, start + pen.widthOf(lead, light), top, strong);
    });
  });
  pen.within('P', () =>
    pen.word(
      report.revision,
      x,
      y + 31,
      { face: 'semibold', size: 10.5, align: 'right', color: ink.second },
      width,
    ),
  );
}

function drawRule(pen: Pen, sheet: Sheet, y: number, weight: number): number {
  pen.artifact(() => pen.line(sheet.left, y, sheet.right, y, weight));
  return y;
}

function drawSuperseded(pen: Pen, sheet: Sheet, words: string, y: number): number {
  const width = sheet.right - sheet.left;
  const style = { face: 'bold', size: 11, color: ink.paper } as const;
  const height = pen.heightOf(words, width - 20, style, 14) + 10;
  pen.artifact(() => pen.document.rect(sheet.left, y - 6, width, height).fill(ink.full));
  pen.paragraphIn('P', words, sheet.left + 10, y - 1, width - 20, style, 14);
  return y + height + 8;
}
