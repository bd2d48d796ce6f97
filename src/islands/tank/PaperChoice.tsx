import { lengthUnits, lengthUnitWords } from '~/domain/units/length-unit';
import { volumeUnits, volumeUnitWords } from '~/domain/units/volume-unit';
import { useUnitsPreference, type UnitsPreference } from '../shared/units-preference';
import { useAwake } from '../shared/use-awake';

const papers = [
  { value: 'a4', text: 'A4' },
  { value: 'letter', text: 'Letter' },
];

/** The chart of one revision as a download, in the units and on the paper that this person last chose. */
export function PaperChoice({
  revisionId,
  letter,
  person,
}: {
  revisionId: string;
  letter: string;
  person: string;
}) {
  const awake = useAwake();
  const [units, change] = useUnitsPreference(person);
  const query = new URLSearchParams({
    paper: units.paper,
    length: units.length,
    volume: units.volume,
  });
  const set = (key: keyof UnitsPreference) => (value: string) => change({ [key]: value });
  return (
    <div className="grid max-w-2xl gap-5">
      <fieldset disabled={!awake} className="grid gap-x-6 gap-y-3 sm:grid-cols-3">
        <legend className="sr-only">How the chart is printed</legend>
        <Picked label="Paper" value={units.paper} onPick={set('paper')} options={papers} />
        <Picked
          label="Depth in"
          value={units.length}
          onPick={set('length')}
          options={lengthUnits.map((unit) => ({ value: unit, text: lengthUnitWords[unit] }))}
        />
        <Picked
          label="Volume in"
          value={units.volume}
          onPick={set('volume')}
          options={volumeUnits.map((unit) => ({ value: unit, text: volumeUnitWords[unit] }))}
        />
      </fieldset>
      <p>
        <a
          className="act"
          href={`/api/v1/revisions/${encodeURIComponent(revisionId)}/chart.pdf?${query}`}
          download
        >
          Print the chart of {letter} (PDF)
        </a>
      </p>
    </div>
  );
}

function Picked(props: {
  label: string;
  value: string;
  options: readonly { value: string; text: string }[];
  onPick(value: string): void;
}) {
  return (
    <label className="label">
      {props.label}
      <select
        className="typed text-base"
        value={props.value}
        onChange={(event) => props.onPick(event.target.value)}
      >
        {props.options.map(({ value, text }) => (
          <option key={value} value={value}>
            {text}
          </option>
        ))}
      </select>
    </label>
  );
}
