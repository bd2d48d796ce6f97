import type { Parsed } from './TypedNumber';

export interface PointColumn {
  label: string;
  parse(text: string): Parsed;
  /** May be left empty: nothing is set there. */
  mayBeEmpty?: true;
}

/** Lines of cells as a spreadsheet copies them (tabs) or as a list is written (commas); null for one plain value. */
export function pastedCells(text: string): string[][] | null {
  const lines = text.replace(/\r\n?/g, '\n').replace(/\n+$/, '').split('\n');
  if (lines.length === 1 && !/[\t,]/.test(lines[0]!)) return null;
  const split = text.includes('\t') ? '\t' : ',';
  return lines.map((line) => line.split(split).map((cell) => cell.trim()));
}

type Row = readonly (number | null)[];

/**
 * The rows from `from` on after a paste whose first column goes into `column`. Pasted into the first column they take
 * the place of all that follow; into another one, rows beyond the pasted ones stay. Refused in one sentence when
 * something is no number or a row would be left without one.
 */
export function pastedRows(
  cells: readonly (readonly string[])[],
  rows: readonly Row[],
  { from, column }: { from: number; column: number },
  columns: readonly PointColumn[],
): { rows: Row[] } | { refused: string } {
  const pasted: Row[] = [];
  for (const [line, texts] of cells.entries()) {
    if (column + texts.length > columns.length) {
      const names = columns.slice(column).map(({ label }) => label);
      return {
        refused: `Nothing is taken: line ${line + 1} of what was pasted has ${texts.length} columns, and there is room for ${names.join(', ')}.`,
      };
    }
    const row: (number | null)[] = columns.map((_, c) =>
      column === 0 ? null : (rows[from + line]?.[c] ?? null),
    );
    for (const [offset, text] of texts.entries()) {
      const { label, parse, mayBeEmpty } = columns[column + offset]!;
      if (text === '' && mayBeEmpty) {
        row[column + offset] = null;
        continue;
      }
      const parsed = parse(text);
      if ('refused' in parsed) {
        const what = text === '' ? 'is empty' : `is “${text.slice(0, 24)}”`;
        return {
          refused: `Nothing is taken: ${label} in line ${line + 1} of what was pasted ${what}. Paste numbers in columns, with a decimal point.`,
        };
      }
      row[column + offset] = parsed.value;
    }
    const missing = columns.findIndex(({ mayBeEmpty }, c) => row[c] === null && !mayBeEmpty);
    if (missing >= 0) {
      return {
        refused: `Nothing is taken: line ${line + 1} of what was pasted has no ${columns[missing]!.label}. Paste all columns of new points together.`,
      };
    }
    pasted.push(row);
  }
  return { rows: column === 0 ? pasted : [...pasted, ...rows.slice(from + pasted.length)] };
}
