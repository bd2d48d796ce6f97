import type { Reading } from '~/domain/reading/reading';
import { useUnitsPreference } from '../shared/units-preference';
import { ReadingsTable } from '../tank-card/ReadingsTable';
import { LevelPlot } from './LevelPlot';

/** The last readings on the tank page, in the units of whoever looks. */
export function TankReadings({
  readings,
  person,
}: {
  readings: readonly Reading[];
  person: string;
}) {
  const [units] = useUnitsPreference(person);
  return (
    <>
      {readings.length > 1 && <LevelPlot readings={readings} volume={units.volume} />}
      <ReadingsTable readings={readings} units={units} />
    </>
  );
}
