import { useId, useState } from 'react';
import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import { parseLength } from '~/domain/units/parse-length';
import { useAwake } from '../shared/use-awake';
import type { HullSizes } from './v-hull';

const fields = [
  { key: 'widthMm', label: 'Width at the top' },
  { key: 'depthMm', label: 'Depth' },
  { key: 'lengthMm', label: 'Length' },
] as const;

/** Sizes of a small craft's tank: below and above them the front page has nothing to show. */
const [leastMm, mostMm] = [50, 5000];

/** The three inside sizes of the hull, typed as people write them. */
export function HullSizesFields({
  sizes,
  onSizes,
}: {
  sizes: HullSizes;
  onSizes(sizes: HullSizes): void;
}) {
  const awake = useAwake();
  return (
    <fieldset disabled={!awake}>
      <legend className="label">Inside sizes, mm: change one</legend>
      <div className="grid grid-cols-3 gap-4">
        {fields.map(({ key, label }) => (
          <SizeField
            key={key}
            label={label}
            mm={sizes[key]}
            onMm={(mm) => onSizes({ ...sizes, [key]: mm })}
          />
        ))}
      </div>
    </fieldset>
  );
}

function SizeField({ label, mm, onMm }: { label: string; mm: number; onMm(mm: number): void }) {
  const id = useId();
  const [text, setText] = useState(formatLength(mm, 'mm'));
  const [fault, setFault] = useState<string | null>(null);
  const type = (next: string): void => {
    setText(next);
    const parsed = parseLength(next, 'mm');
    if ('refused' in parsed) setFault(parsed.refused);
    else if (parsed.mm < leastMm || parsed.mm > mostMm) {
      setFault(`Give ${leastMm} to ${formatLengthWithUnit(mostMm, 'mm')} here.`);
    } else {
      setFault(null);
      onMm(parsed.mm);
    }
  };
  return (
    <div>
      <label htmlFor={id} className="label block whitespace-nowrap">
        {label}
      </label>
      <input
        id={id}
        className="typed"
        value={text}
        onChange={(event) => type(event.target.value)}
        // what was understood takes the place of what was typed once the field is left
        onBlur={() => fault === null && setText(formatLength(mm, 'mm'))}
        aria-invalid={fault !== null}
        aria-describedby={fault === null ? undefined : `${id}-fault`}
        autoComplete="off"
      />
      {fault && (
        <p id={`${id}-fault`} className="fault mt-1">
          {fault}
        </p>
      )}
    </div>
  );
}
