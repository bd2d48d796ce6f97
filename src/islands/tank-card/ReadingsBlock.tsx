import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import { formatVolume } from '~/domain/units/format-volume';
import { volumeUnitSigns } from '~/domain/units/volume-unit';
import { Moment } from '../shared/Moment';
import type { UnitsPreference } from '../shared/units-preference';
import type { Readings } from './use-readings';

/** Readings that wait to be sent, then the last ones that were kept. */
export function ReadingsBlock({ readings, units }: { readings: Readings; units: UnitsPreference }) {
  return (
    <section aria-labelledby="last-readings" className="grid gap-4">
      <h2 id="last-readings">Last readings</h2>
      {readings.unsent.length > 0 && (
        <div className="border border-dashed border-ink p-3">
          <p className="font-semibold">Waiting to be sent</p>
          <ul>
            {readings.unsent.map(({ key, reading }) => (
              <li key={key} className="flex flex-wrap items-baseline justify-between gap-x-4">
                <span>
                  {formatLengthWithUnit(reading.depthMm, units.length)}, <Moment at={reading.at} />
                </span>
                <button type="button" className="act-text min-h-8" onClick={() => readings.drop(key)}>
                  Drop it
                </button>
              </li>
            ))}
          </ul>
          <button type="button" className="act-plain mt-2" disabled={readings.sending} onClick={readings.sendAgain}>
            Send again
          </button>
        </div>
      )}
      {readings.kept.length === 0 ? (
        <p className="text-ink-2">None yet. Dip the tank, type the depth and keep it: two dated readings show the use.</p>
      ) : (
        <div className="overflow-x-auto">
          <table className="drawn-table">
            <thead>
              <tr>
                <th scope="col">when</th>
                <th scope="col" className="figure">
                  depth, {units.length}
                </th>
                <th scope="col" className="figure">
                  usable, {volumeUnitSigns[units.volume]}
                </th>
                <th scope="col">by</th>
              </tr>
            </thead>
            <tbody>
              {readings.kept.slice(0, 8).map((reading) => (
                <tr key={reading.id}>
                  <td>
                    <Moment at={reading.at} />
                  </td>
                  <td className="figure">{formatLength(reading.depthMm, units.length)}</td>
                  <td className="figure">{formatVolume(reading.usableL, units.volume, reading.plusMinusL)}</td>
                  <td>
                    {reading.by}, table {reading.revision}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </section>
  );
}
