import type { InputHTMLAttributes, ReactNode } from 'react';
import type { FieldValues, Path } from 'react-hook-form';
import type { SentForm } from './use-sent-form';

type Extra = Omit<InputHTMLAttributes<HTMLInputElement>, 'name' | 'form' | 'id'>;

/** One typed value: its label above, its fault beside it, both tied to it for a screen reader. */
export function Field<In extends FieldValues, Out>({
  of,
  name,
  label,
  hint,
  ...input
}: { of: SentForm<In, Out>; name: Path<In> & string; label: string; hint?: ReactNode } & Extra) {
  const id = of.fieldId(name);
  const fault = of.faultOf(name);
  return (
    <div>
      <label htmlFor={id} className="label block">
        {label}
      </label>
      <input
        {...input}
        {...of.form.register(name)}
        id={id}
        className="typed"
        {...described(id, fault, hint)}
      />
      <Beside id={id} fault={fault} hint={hint} />
    </div>
  );
}

/** One of a list. */
export function Choice<In extends FieldValues, Out>({
  of,
  name,
  label,
  hint,
  options,
  asNumber = false,
}: {
  of: SentForm<In, Out>;
  name: Path<In> & string;
  label: string;
  hint?: ReactNode;
  options: readonly { value: string; text: string }[];
  asNumber?: boolean;
}) {
  const id = of.fieldId(name);
  const fault = of.faultOf(name);
  return (
    <div>
      <label htmlFor={id} className="label block">
        {label}
      </label>
      <select
        {...of.form.register(name, asNumber ? { valueAsNumber: true } : {})}
        id={id}
        className="typed"
        {...described(id, fault, hint)}
      >
        {options.map(({ value, text }) => (
          <option key={value} value={value}>
            {text}
          </option>
        ))}
      </select>
      <Beside id={id} fault={fault} hint={hint} />
    </div>
  );
}

function described(id: string, fault: string | undefined, hint: ReactNode) {
  const ids = [fault ? `${id}-fault` : '', hint ? `${id}-hint` : ''].filter(Boolean).join(' ');
  return { 'aria-invalid': fault !== undefined, 'aria-describedby': ids === '' ? undefined : ids };
}

function Beside({ id, fault, hint }: { id: string; fault: string | undefined; hint: ReactNode }) {
  return (
    <>
      {fault && (
        <p id={`${id}-fault`} className="fault mt-1">
          {fault}
        </p>
      )}
      {hint && (
        <div id={`${id}-hint`} className="label mt-1">
          {hint}
        </div>
      )}
    </>
  );
}
