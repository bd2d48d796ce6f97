import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import type { LengthUnit } from '~/domain/units/length-unit';
import { useAwake } from '../shared/use-awake';
import type { Dip, DipMeans } from './dip';

/** "How deep is it?": one field, and which way the reading was taken. */
export function DipField(props: {
  text: string;
  means: DipMeans;
  unit: LengthUnit;
  dip: Dip;
  onText(text: string): void;
  onMeans(means: DipMeans): void;
}) {
  const { text, means, unit, dip } = props;
  const awake = useAwake();
  const askedBack = dip.is === 'asked-back' ? dip.why : null;
  const echo = dip.is === 'read' ? echoOf(text, dip.typedMm, unit) : null;
  return (
    <div>
      <label htmlFor="dip" className="label block">
        {means === 'depth' ? 'How deep is it?' : 'How much space above?'}
      </label>
      <div className="flex items-baseline gap-3">
        <input
          id="dip"
          className="typed min-w-0 border-b-2 text-name font-semibold not-aria-invalid:not-placeholder-shown:border-b-datum"
          value={text}
          disabled={!awake}
          onChange={(event) => props.onText(event.target.value)}
          inputMode={unit === 'in' ? 'text' : 'decimal'}
          autoComplete="off"
          enterKeyHint="done"
          placeholder=" "
          aria-invalid={askedBack !== null}
          aria-describedby="dip-says"
        />
        <span className="text-lead text-ink-2">{unit}</span>
      </div>
      <p id="dip-says" className="mt-1 min-h-5" aria-live="polite">
        {askedBack !== null && <span className="fault">{askedBack}</span>}
        {echo !== null && <span className="label">= {echo}</span>}
      </p>
      <fieldset className="mt-1 flex flex-wrap gap-x-4" disabled={!awake}>
        <legend className="sr-only">Which way the reading was taken</legend>
        <Means value="depth" chosen={means} onChoose={props.onMeans} text="depth" />
        <Means value="space" chosen={means} onChoose={props.onMeans} text="space above" />
      </fieldset>
    </div>
  );
}

function Means(props: {
  value: DipMeans;
  chosen: DipMeans;
  text: string;
  onChoose(means: DipMeans): void;
}) {
  return (
    <label className="flex min-h-8 items-center gap-1.5 whitespace-nowrap">
      <input
        type="radio"
        name="dip-means"
        className="accent-ink"
        checked={props.chosen === props.value}
        onChange={() => props.onChoose(props.value)}
      />
      {props.text}
    </label>
  );
}

/** What was understood, when it is not plainly what was typed. */
function echoOf(text: string, mm: number, unit: LengthUnit): string | null {
  const plain = formatLength(mm, unit);
  return text.trim() === plain ? null : formatLengthWithUnit(mm, unit);
}
