import { formatLengthWithUnit } from '~/domain/units/format-length';
import { Moment } from '../shared/Moment';
import type { UnitsPreference } from '../shared/units-preference';
import { ReadingsTable } from './ReadingsTable';
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
                <button
                  type="button"
                  className="act-text min-h-8"
                  onClick={() => readings.drop(key)}
                >
                  Drop it
                </button>
              </li>
            ))}
          </ul>
          <button
            type="button"
            className="act-plain mt-2"
            disabled={readings.sending}
            onClick={readings.sendAgain}
          >
            Send again
          </button>
        </div>
      )}
      {readings.kept.length === 0 ? (
        <p className="text-ink-2">
          None yet. Dip the tank, type the depth and keep it: two dated readings show the use.
        </p>
      ) : (
        <ReadingsTable readings={readings.kept.slice(0, 8)} units={units} />
      )}
    </section>
  );
}
