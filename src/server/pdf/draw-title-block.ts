import type { ChartReport } from '~/domain/report/chart-report';
import { ink } from './ink';
import type { Pen } from './pen';
import type { Sheet } from './sheet';

const labelStyle = { size: 6.5, color: ink.second } as const;
const textStyle = { face: 'semibold', size: 8 } as const;
const leading = 9.4;
const pad = 5;
const shares = [1.35, 1.2, 1.15, 0.85, 1.2, 0.75, 0.55];

/** Height of the strip at the foot of every page. */
export function titleBlockHeight(
  pen: Pen,
  sheet: Sheet,
  report: ChartReport,
  pages: number,
): number {
  return drawnHeight(pen, cellsOf(sheet, report, `${pages} of ${pages}`));
}

/** The title block of a drawing: whose, which, when, and the page. Stands on the bottom margin. */
export function drawTitleBlock(
  pen: Pen,
  sheet: Sheet,
  report: ChartReport,
  page: number,
  pages: number,
): void {
  const cells = cellsOf(sheet, report, `${page} of ${pages}`);
  const height = titleBlockHeight(pen, sheet, report, pages);
  const top = sheet.bottom - height;
  pen.artifact(() => {
    pen.document
      .rect(sheet.left, top, sheet.right - sheet.left, height)
      .lineWidth(0.7)
      .strokeColor(ink.full)
      .stroke();
    for (const { x } of cells.slice(1)) pen.line(x, top, x, sheet.bottom, 0.5, ink.full);
  });
  for (const { x, width, label, text } of cells) {
    pen.within('P', () => {
      pen.word(label, x + pad, top + 2.6, labelStyle);
      pen.paragraph(text, x + pad, top + 10.6, width - 2 * pad, textStyle, leading);
    });
  }
}

interface Cell {
  x: number;
  width: number;
  label: string;
  text: string;
}

function cellsOf(sheet: Sheet, report: ChartReport, page: string): Cell[] {
  const entries = [...report.titleBlock, { label: 'Page', text: page }];
  const total = shares.reduce((sum, share) => sum + share, 0);
  let x = sheet.left;
  return entries.map((entry, index) => {
    const width = ((sheet.right - sheet.left) * (shares[index] ?? 1)) / total;
    const cell = { ...entry, x, width };
    x += width;
    return cell;
  });
}

function drawnHeight(pen: Pen, cells: readonly Cell[]): number {
  const tallest = Math.max(
    ...cells.map(({ text, width }) => pen.heightOf(text, width - 2 * pad, textStyle, leading)),
  );
  return 10.6 + tallest + 3.4;
}
