import type { ChartReport, ChartRow } from '~/domain/report/chart-report';
import { ink } from './ink';
import { fillRegion } from './patterns';
import type { Pen, TextStyle } from './pen';

const band = 5;
export const blockGap = 16;
export const columnHeadHeight = 17;
const largestSize = 12;
const leastSize = 6;

/** Right edges of the columns, from the left of a block, and the size that lets every cell fit. */
export interface ColumnPlan {
  size: number;
  rights: readonly number[];
  /** true where the depth is in inches and eighths. */
  wholes: boolean;
}

/** One plan for all blocks of a page, from the widest cell of every column. */
export function planColumns(
  pen: Pen,
  { columns, rows }: ChartReport,
  width: number,
  rowHeight: number,
): ColumnPlan {
  const usual = Math.min(largestSize, rowHeight * 0.66);
  const widths = columns.map(({ head }, column) =>
    Math.max(
      pen.widthOf(head, headStyle(usual)),
      ...rows.map(({ cells }) => cellWidth(pen, cells[column]!, usual)),
    ),
  );
  const room = width - band - 2;
  const least = 6;
  const needed = widths.reduce((sum, each) => sum + each + least, 0);
  const size = needed > room ? Math.max(leastSize, (usual * room) / needed) : usual;
  const scale = size / usual;
  const spare =
    Math.max(0, room - widths.reduce((sum, each) => sum + each * scale, 0)) / columns.length;
  let edge = band;
  const wholes = rows.some(({ cells }) => eighths.test(cells[0] ?? ''));
  return { size, wholes, rights: widths.map((each) => (edge += each * scale + spare)) };
}

export interface Block {
  x: number;
  top: number;
  width: number;
  rowHeight: number;
}

/** A block of rows with its head. The narrow band at its left is a piece of the stick: the region of every row. */
export function drawRows(
  pen: Pen,
  report: ChartReport,
  rows: readonly ChartRow[],
  plan: ColumnPlan,
  block: Block,
): void {
  const { x, top, width, rowHeight } = block;
  pen.within('TR', () =>
    report.columns.forEach(({ head }, column) =>
      pen.within('TH', () => cell(pen, head, x, top + 2, plan, column, headStyle(plan.size)), {
        scope: 'Column',
      }),
    ),
  );
  const first = top + columnHeadHeight;
  drawRules(pen, rows, { ...block, top: first });
  rows.forEach((row, index) => {
    const y = first + index * rowHeight;
    pen.within('TR', () =>
      row.cells.forEach((text, column) => {
        const style = cellStyle(report, row, column, plan.size);
        // middle of the digits on the middle of the row
        const textTop = y + rowHeight / 2 - style.size * 0.655;
        pen.within('TD', () => cell(pen, text, x, textTop, plan, column, style));
      }),
    );
  });
  pen.artifact(() => pen.line(x, first, x + width, first, 0.9));
}

function drawRules(pen: Pen, rows: readonly ChartRow[], { x, top, width, rowHeight }: Block): void {
  pen.artifact(() => {
    for (const { from, to, region } of runs(rows)) {
      fillRegion(pen.document, region, x, top + from * rowHeight, band, (to - from) * rowHeight);
    }
    pen.line(x + band, top, x + band, top + rows.length * rowHeight, 0.4, ink.line);
    rows.forEach(({ strong }, index) => {
      const y = top + (index + 1) * rowHeight;
      const last = index === rows.length - 1;
      pen.line(
        x,
        y,
        x + width,
        y,
        strong || last ? 0.6 : 0.3,
        strong || last ? ink.full : ink.hair,
      );
    });
  });
}

/** Neighbouring rows of one region. */
function runs(
  rows: readonly ChartRow[],
): { from: number; to: number; region: ChartRow['region'] }[] {
  const found: { from: number; to: number; region: ChartRow['region'] }[] = [];
  rows.forEach(({ region }, index) => {
    const last = found.at(-1);
    if (last?.region === region) last.to = index + 1;
    else found.push({ from: index, to: index + 1, region });
  });
  return found;
}

/** Whole inches stand in one column and eighths in another, as on a rule. */
const eighths = /^(\d[\d\u202f]*)?( ?)([1-7]\/8)$/;
const widestEighth = ' 8/8';

function cell(
  pen: Pen,
  text: string,
  x: number,
  y: number,
  { rights, wholes }: ColumnPlan,
  column: number,
  style: TextStyle,
): void {
  const right = { ...style, align: 'right' } as const;
  const room = rights[column];
  if (room === undefined) return;
  if (column > 0 || !wholes || !/\d$/.test(text)) return pen.word(text, x, y, right, room);
  const parts = eighths.exec(text);
  const whole = parts === null ? text : (parts[1] ?? '');
  const eighth = parts?.[3];
  if (whole !== '') pen.word(whole, x, y, right, room - pen.widthOf(widestEighth, style));
  if (eighth !== undefined) pen.word(whole === '' ? eighth : ` ${eighth}`, x, y, right, room);
}

function cellWidth(pen: Pen, text: string, size: number): number {
  const whole = eighths.exec(text) === null ? text : text.replace(eighths, '$1 8/8');
  return pen.widthOf(whole, { face: 'bold', size });
}

function headStyle(size: number): TextStyle {
  return { face: 'semibold', size: Math.min(8.5, size * 0.9), color: ink.second };
}

function cellStyle(
  { columns }: ChartReport,
  { strong }: ChartRow,
  column: number,
  size: number,
): TextStyle {
  const { key } = columns[column]!;
  if (key === 'plusMinus') return { size, color: ink.second };
  if (strong) return { face: 'bold', size };
  return { face: key === 'depth' || column === 1 ? 'semibold' : 'regular', size };
}
