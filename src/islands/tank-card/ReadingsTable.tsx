import type { Reading } from '~/domain/reading/reading';
import { formatLength } from '~/domain/units/format-length';
import { formatVolume } from '~/domain/units/format-volume';
import { volumeUnitSigns } from '~/domain/units/volume-unit';
import { Moment } from '../shared/Moment';
import type { UnitsPreference } from '../shared/units-preference';

/** Kept readings, latest first, in one person's units. */
export function ReadingsTable({
  readings,
  units,
}: {
  readings: readonly Reading[];
  units: UnitsPreference;
}) {
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Table of readings">
      <table className="drawn-table">
        <thead>
          <tr>
            <th scope="col" className="sticky left-0 bg-film">
              when
            </th>
            <th scope="col" className="figure">
              depth, {units.length}
            </th>
            <th scope="col" className="figure">
              usable, {volumeUnitSigns[units.volume]}
            </th>
            <th scope="col">by, table</th>
          </tr>
        </thead>
        <tbody>
          {readings.map((reading) => (
            <tr key={reading.id}>
              <td className="sticky left-0 bg-film">
                <Moment at={reading.at} />
              </td>
              <td className="figure">{formatLength(reading.depthMm, units.length)}</td>
              <td className="figure">
                {formatVolume(reading.usableL, units.volume, reading.plusMinusL)}
              </td>
              <td className="whitespace-nowrap">
                {reading.by}, {reading.revision}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
