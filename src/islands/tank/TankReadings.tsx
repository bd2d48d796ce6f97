import type { Reading } from '~/domain/reading/reading';
import { useUnitsPreference } from '../shared/units-preference';
import { ReadingsTable } from '../tank-card/ReadingsTable';

/** The last readings on the tank page, in the units of whoever looks. */
export function TankReadings({
  readings,
  person,
}: {
  readings: readonly Reading[];
  person: string;
}) {
  const [units] = useUnitsPreference(person);
  return <ReadingsTable readings={readings} units={units} />;
}
