import { useMemo, useState } from 'react';
import type { DipTable } from '~/domain/table/answer-at';
import { mmPerLengthUnit, type LengthUnit } from '~/domain/units/length-unit';
import { marksFor, multiples } from '~/domain/units/marks';
import { volumeUnitSigns, type VolumeUnit } from '~/domain/units/volume-unit';
import { digitsOf, rowFigures } from './figures';

interface FineTableProps {
  table: DipTable;
  length: LengthUnit;
  volume: VolumeUnit;
}

/** The full table, finer than what fits beside the stick. Opened by who wants it. */
export function FineTable({ table, length, volume }: FineTableProps) {
  const [open, setOpen] = useState(false);
  return (
    <details
      className="border-t border-hair"
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary className="cursor-pointer px-4 py-3 font-semibold sm:px-6">The full table</summary>
      {open && <Rows table={table} length={length} volume={volume} />}
    </details>
  );
}

function Rows({ table, length, volume }: FineTableProps) {
  const rows = useMemo(() => {
    const digits = digitsOf(table, volume);
    const per = mmPerLengthUnit[length];
    const span = table.heightMm / per;
    const step = marksFor(span, 100, 100, length === 'in').numbered;
    const marks = multiples(step, span).map((value) => Math.min(value * per, table.heightMm));
    if (table.heightMm - (marks[marks.length - 1] ?? 0) > 1e-6) marks.push(table.heightMm);
    return marks.map((mm) => ({
      mm,
      figures: rowFigures(table, mm, length, digits),
    }));
  }, [table, length, volume]);
  const litres = volume === 'l' ? 'litres' : volumeUnitSigns[volume];
  return (
    <div
      className="overflow-x-auto px-4 pb-6 sm:px-6"
      tabIndex={0}
      role="group"
      aria-label="Full table"
    >
      <table className="drawn-table max-w-xl">
        <thead>
          <tr>
            <th className="figure sticky left-0 bg-film">{length}</th>
            <th className="figure">{litres}</th>
            <th className="figure">±</th>
            <th className="figure">usable</th>
            <th className="figure">room</th>
            <th className="figure">kg</th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ mm, figures }) => (
            <tr key={mm}>
              <td className="figure sticky left-0 bg-film font-semibold">{figures.depth}</td>
              <td className="figure">{figures.litres}</td>
              <td className="figure text-ink-2">{figures.plusMinus}</td>
              <td className="figure">{figures.usable}</td>
              <td className="figure">{figures.room}</td>
              <td className="figure">{figures.kg}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
