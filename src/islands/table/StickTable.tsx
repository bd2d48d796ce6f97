import { useMemo } from 'react';
import type { DipTable } from '~/domain/table/answer-at';
import { mmPerLengthUnit, type LengthUnit } from '~/domain/units/length-unit';
import { marksFor, multiples } from '~/domain/units/marks';
import { volumeUnitSigns, type VolumeUnit } from '~/domain/units/volume-unit';
import { digitsOf, rowFigures } from './figures';

interface StickTableProps {
  table: DipTable;
  depthMm: number;
  length: LengthUnit;
  volume: VolumeUnit;
  /** y of a reading on the screen, px from the table's own top. */
  yOf(mm: number): number;
  railPx: number;
  heightPx: number;
}

const rowPx = 19;
const columns = ['depth', 'litres', 'usable', 'room', 'kg'] as const;
const grid = 'grid grid-cols-[3.2rem_4rem_4rem_4rem_3rem] text-right';

/**
 * The table beside the stick: every row at its true height, the read one set apart on the wet
 * line. The step is chosen so that rows never crowd; the full table opens below.
 */
export function StickTable(props: StickTableProps) {
  const { table, depthMm, length, volume, yOf, railPx, heightPx } = props;
  const digits = useMemo(() => digitsOf(table, volume), [table, volume]);
  const rows = useMemo(() => {
    const per = mmPerLengthUnit[length];
    const span = table.heightMm / per;
    const step = marksFor(span, railPx / rowPx, railPx / rowPx, length === 'in').numbered;
    return multiples(step, span)
      .map((value) => Math.min(value * per, table.heightMm))
      .map((mm) => ({ mm, figures: rowFigures(table, mm, length, digits) }));
  }, [table, length, digits, railPx]);
  const read = rowFigures(table, depthMm, length, digits);
  const wetY = yOf(depthMm);
  const headTop = yOf(table.heightMm) - rowPx - 15;
  const heads = {
    depth: length,
    litres: volume === 'l' ? 'litres' : volumeUnitSigns[volume],
    usable: 'usable',
    room: 'room',
    kg: 'kg',
  };

  return (
    <div
      role="table"
      aria-label="Table beside the stick"
      className="relative w-[18.2rem]"
      style={{ height: heightPx }}
    >
      <div
        role="row"
        className={`${grid} absolute w-full border-b border-ink pb-1 text-note font-semibold`}
        style={{ top: headTop, height: rowPx + 2 }}
      >
        {columns.map((column) => (
          <span role="columnheader" key={column}>
            {heads[column]}
          </span>
        ))}
      </div>
      {rows.map(({ mm, figures }) => {
        const y = yOf(mm);
        if (y > wetY - 1.6 * rowPx && y < wetY + 0.6 * rowPx) return null;
        return (
          <div
            role="row"
            key={mm}
            className={`${grid} absolute w-full border-b border-hair leading-none`}
            style={{ top: y - rowPx / 2, height: rowPx }}
          >
            {columns.map((column) => (
              <span role="cell" key={column} className="self-center text-[0.875rem]">
                {figures[column]}
              </span>
            ))}
          </div>
        );
      })}
      <div
        role="row"
        aria-current="true"
        data-testid="read-row"
        className={`${grid} absolute w-full font-bold leading-none text-base`}
        style={{ top: wetY - rowPx - 1, height: rowPx }}
      >
        {columns.map((column) => (
          <span role="cell" key={column} className="self-center">
            {read[column]}
          </span>
        ))}
      </div>
    </div>
  );
}
