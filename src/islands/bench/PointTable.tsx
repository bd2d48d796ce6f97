import { Fragment, useId, useRef, useState, type ClipboardEvent, type KeyboardEvent } from 'react';
import { pastedCells, pastedRows, type PointColumn } from './pasted-rows';

interface PointTableProps {
  /** What each cell's name begins with: "profile", "station 2". */
  name: string;
  columns: readonly PointColumn[];
  rows: readonly (readonly (number | null)[])[];
  format(mm: number): string;
  /** The sentence of a fault of a point (`column` null) or of one of its numbers. */
  faultAt(row: number, column: number | null): string | undefined;
  chosen: number | null;
  onChoose(row: number): void;
  onNumber(row: number, column: number, value: number | null): void;
  onRows(from: number, rows: readonly (readonly (number | null)[])[]): void;
  onAdd(after: number): void;
  onRemove(row: number): void;
  least: number;
  most: number;
  /** Said beside adding and removing, where it goes beyond this table. */
  where?: string;
}

/**
 * Points in a table: typed like any number, walked by arrow keys and Enter, columns pasted from a spreadsheet. What
 * is refused stays in its cell, with one sentence below the row.
 */
export function PointTable(props: PointTableProps) {
  const { name, columns, rows, format, least, most, where = '' } = props;
  const id = useId();
  const table = useRef<HTMLTableElement>(null);
  const [drafts, setDrafts] = useState<Readonly<Record<string, string>>>({});
  const [refusedPaste, setRefusedPaste] = useState<string | null>(null);

  const valueOf = (row: number, column: number) => rows[row]?.[column] ?? null;
  const parsedDraft = (row: number, column: number) => {
    const draft = drafts[keyOf(row, column)];
    if (draft === undefined) return null;
    const { parse, mayBeEmpty } = columns[column]!;
    if (draft.trim() !== '') return parse(draft);
    return mayBeEmpty ? { value: null } : { refused: 'Type a number.' };
  };
  const faultsOf = (row: number) =>
    columns.flatMap(({ label }, column) => {
      const parsed = parsedDraft(row, column);
      const fault =
        parsed === null
          ? props.faultAt(row, column)
          : 'refused' in parsed
            ? parsed.refused
            : undefined;
      return fault === undefined ? [] : [{ column, sentence: `${label}: ${fault}` }];
    });

  const take = (row: number, column: number) => {
    const parsed = parsedDraft(row, column);
    if (parsed === null || 'refused' in parsed) return;
    setDrafts((now) => without(now, keyOf(row, column)));
    if (parsed.value !== valueOf(row, column)) props.onNumber(row, column, parsed.value);
  };
  const press = (event: KeyboardEvent<HTMLInputElement>, row: number, column: number) => {
    if (event.key === 'Escape') setDrafts((now) => without(now, keyOf(row, column)));
    const to = stepTo(event.key, row, column, columns.length);
    if (!to || event.nativeEvent.isComposing) return;
    event.preventDefault();
    const parsed = parsedDraft(row, column);
    if (event.key === 'Enter' && parsed && 'refused' in parsed) return;
    const next = table.current?.querySelector<HTMLInputElement>(`[data-cell="${keyOf(...to)}"]`);
    // leaving the cell takes it over
    if (next) next.focus();
    else take(row, column);
  };
  const paste = (event: ClipboardEvent<HTMLInputElement>, row: number, column: number) => {
    const cells = pastedCells(event.clipboardData.getData('text'));
    if (cells === null) return;
    event.preventDefault();
    const after = pastedRows(cells, rows, { from: row, column }, columns);
    const count = 'rows' in after ? row + after.rows.length : 0;
    if ('refused' in after) setRefusedPaste(after.refused);
    else if (count < least || count > most) {
      setRefusedPaste(
        `Nothing is taken: that would make ${count} points, and there are ${least} to ${most} of them.`,
      );
    } else {
      setRefusedPaste(null);
      setDrafts((now) => keep(now, (at) => (at < row ? at : null)));
      props.onRows(row, after.rows);
    }
  };
  const add = (row: number) => {
    setDrafts((now) => keep(now, (at) => (at > row ? at + 1 : at)));
    props.onAdd(row);
  };
  const remove = (row: number) => {
    setDrafts((now) => keep(now, (at) => (at === row ? null : at > row ? at - 1 : at)));
    props.onRemove(row);
  };

  return (
    <div className="min-w-0 max-w-full overflow-x-auto">
      <table ref={table} className="drawn-table w-auto!" aria-label={`Points of the ${name}`}>
        <thead>
          <tr>
            <th className="px-1!">
              <span className="sr-only">point</span>
            </th>
            {columns.map(({ label }) => (
              <th key={label} className="figure px-1.5!">
                {label}
              </th>
            ))}
            <th className="px-0!">
              <span className="sr-only">add and remove</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((values, row) => {
            const point = `point ${row + 1}`;
            const faults = faultsOf(row);
            const whole = props.faultAt(row, null);
            const faultId = `${id}-${row}`;
            return (
              <Fragment key={row}>
                <tr className={row === props.chosen ? 'bg-wash' : undefined}>
                  <th
                    scope="row"
                    className="w-7 border-b-hair! px-1! py-0! text-right! align-middle"
                  >
                    {row + 1}
                  </th>
                  {columns.map(({ label, mayBeEmpty }, column) => {
                    const key = keyOf(row, column);
                    const value = values[column] ?? null;
                    const faulty = faults.some((fault) => fault.column === column);
                    return (
                      <td key={label} className="border-b-hair! px-1.5! py-0!">
                        <input
                          data-cell={key}
                          className="typed min-h-7! w-16! border-b-transparent! py-0! text-right"
                          aria-label={`${name}, ${point}, ${label}`}
                          inputMode="text"
                          autoComplete="off"
                          spellCheck={false}
                          placeholder={mayBeEmpty ? 'sharp' : undefined}
                          value={drafts[key] ?? (value === null ? '' : format(value))}
                          aria-invalid={faulty}
                          aria-describedby={
                            faults.length > 0 || whole !== undefined ? faultId : undefined
                          }
                          onFocus={(event) => {
                            event.target.select();
                            props.onChoose(row);
                          }}
                          onChange={(event) => {
                            const { value: text } = event.target;
                            setRefusedPaste(null);
                            setDrafts((now) => ({ ...now, [key]: text }));
                          }}
                          onBlur={() => take(row, column)}
                          onKeyDown={(event) => press(event, row, column)}
                          onPaste={(event) => paste(event, row, column)}
                        />
                      </td>
                    );
                  })}
                  <td className="border-b-hair! px-0! py-0! whitespace-nowrap">
                    <button
                      type="button"
                      className="act-text size-7 no-underline"
                      aria-label={`add a point after ${point} of the ${name}${where}`}
                      title={`add a point after this one${where}`}
                      disabled={rows.length >= most}
                      onClick={() => add(row)}
                    >
                      +
                    </button>
                    <button
                      type="button"
                      className="act-text size-7 no-underline"
                      aria-label={`remove ${point} of the ${name}${where}`}
                      title={`remove this point${where}`}
                      disabled={rows.length <= least}
                      onClick={() => remove(row)}
                    >
                      −
                    </button>
                  </td>
                </tr>
                {(faults.length > 0 || whole !== undefined) && (
                  <tr>
                    <td id={faultId} colSpan={columns.length + 2} className="px-1! py-1!">
                      {[
                        ...(whole === undefined ? [] : [whole]),
                        ...faults.map((f) => f.sentence),
                      ].map((sentence) => (
                        <p key={sentence} className="fault max-w-72" role="alert">
                          {sentence}
                        </p>
                      ))}
                    </td>
                  </tr>
                )}
              </Fragment>
            );
          })}
        </tbody>
      </table>
      {refusedPaste && (
        <p className="fault max-w-80 pt-1" role="alert">
          {refusedPaste}
        </p>
      )}
    </div>
  );
}

function keyOf(row: number, column: number): string {
  return `${row}/${column}`;
}

/** Where a key leads from a cell: down and up a column; Enter along the row and on to the next. */
function stepTo(
  key: string,
  row: number,
  column: number,
  columns: number,
): [number, number] | null {
  if (key === 'ArrowDown') return [row + 1, column];
  if (key === 'ArrowUp') return [row - 1, column];
  if (key !== 'Enter') return null;
  return column + 1 < columns ? [row, column + 1] : [row + 1, 0];
}

function without<Value>(record: Readonly<Record<string, Value>>, key: string) {
  const { [key]: _gone, ...rest } = record;
  return rest;
}

/** What was typed goes along with its row when rows come or go; null: the row is gone. */
function keep(drafts: Readonly<Record<string, string>>, to: (row: number) => number | null) {
  return Object.fromEntries(
    Object.entries(drafts).flatMap(([key, text]) => {
      const [row, column] = key.split('/').map(Number) as [number, number];
      const moved = to(row);
      return moved === null ? [] : [[keyOf(moved, column), text]];
    }),
  );
}
