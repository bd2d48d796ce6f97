import { useId, useState, type KeyboardEvent } from 'react';

export type Parsed = { value: number } | { refused: string };

interface TypedNumberProps {
  label: string;
  /** null: nothing is set, the field is empty. */
  value: number | null;
  parse(text: string): Parsed;
  format(value: number): string;
  onValue(value: number): void;
  /** Only where nothing is a choice: called when the field was emptied. */
  onEmpty?: () => void;
  unit?: string;
  /** What an arrow key adds; Shift adds ten times as much. */
  step?: number;
  /** A fault that the shape has with this value, from the engine or the server. */
  fault?: string | undefined;
  hideLabel?: boolean;
  wide?: boolean;
  placeholder?: string;
  disabled?: boolean;
}

/**
 * A number that is typed as people write it. Taken over with Enter, Tab or a step of an arrow key;
 * Escape gives the old one back. What was understood is echoed while typing, and a refusal stands
 * beside the field with what was typed still in it.
 */
export function TypedNumber(props: TypedNumberProps) {
  const { label, value, parse, format, onValue, onEmpty, unit, step = 1 } = props;
  const id = useId();
  const [draft, setDraft] = useState<string | null>(null);
  const shown = draft ?? (value === null ? '' : format(value));
  const parsed: Parsed | null = draft === null || draft.trim() === '' ? null : parse(draft);
  const refused =
    parsed && 'refused' in parsed
      ? parsed.refused
      : draft !== null && draft.trim() === '' && !onEmpty
        ? 'Type a number.'
        : null;
  const echo =
    parsed && 'value' in parsed && draft !== null && !isPlain(draft) ? format(parsed.value) : null;
  const fault = refused ?? (draft === null ? props.fault : undefined);

  const take = () => {
    if (draft === null) return;
    if (draft.trim() === '') {
      if (!onEmpty) return;
      onEmpty();
    } else if (parsed && 'value' in parsed) {
      if (parsed.value !== value) onValue(parsed.value);
    } else return;
    setDraft(null);
  };
  const press = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') take();
    if (event.key === 'Escape') setDraft(null);
    if (event.key !== 'ArrowUp' && event.key !== 'ArrowDown') return;
    const from = parsed && 'value' in parsed ? parsed.value : value;
    if (from === null) return;
    event.preventDefault();
    const sign = event.key === 'ArrowUp' ? 1 : -1;
    const stride = event.shiftKey ? 10 * step : step;
    setDraft(null);
    onValue(Math.round((from + sign * stride) * 1e6) / 1e6);
  };

  return (
    <div className={props.wide ? 'min-w-0' : 'w-20'}>
      <label htmlFor={id} className={props.hideLabel ? 'sr-only' : 'label block whitespace-nowrap'}>
        {label}
      </label>
      <div className="flex items-baseline gap-1">
        <input
          id={id}
          className="typed min-h-8 py-0.5"
          inputMode="text"
          autoComplete="off"
          spellCheck={false}
          disabled={props.disabled}
          placeholder={props.placeholder}
          value={shown}
          aria-invalid={fault !== undefined && fault !== null}
          aria-describedby={fault ? `${id}-fault` : undefined}
          onFocus={(event) => event.target.select()}
          onChange={(event) => setDraft(event.target.value)}
          onBlur={take}
          onKeyDown={press}
        />
        {unit && <span className="text-note text-ink-2">{unit}</span>}
      </div>
      {echo && (
        <p className="label whitespace-nowrap">
          = {echo}
          {unit ? ` ${unit}` : ''}
        </p>
      )}
      {fault && (
        <p id={`${id}-fault`} className="fault w-44 max-w-full" role="alert">
          {fault}
        </p>
      )}
    </div>
  );
}

function isPlain(text: string): boolean {
  return /^\s*-?\d+(\.\d+)?\s*$/.test(text);
}
