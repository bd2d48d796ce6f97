import { useEffect, useRef } from 'react';
import type { Fault } from './use-sent-form';

/** What is wrong with a form, at its head: takes focus after a failed sending and leads to each field. */
export function FaultSummary({ faults, failures }: { faults: readonly Fault[]; failures: number }) {
  const box = useRef<HTMLDivElement>(null);
  const told = useRef(0);
  // once for every failed sending, whenever its faults are there to be read
  useEffect(() => {
    if (failures === told.current || box.current === null) return;
    told.current = failures;
    box.current.focus();
  });
  if (failures === 0 || faults.length === 0) return null;
  return (
    <div ref={box} tabIndex={-1} role="alert" className="border-l-4 border-ink bg-wash px-4 py-3">
      <p className="font-semibold">
        {faults.length === 1 ? 'One thing to put right' : `${faults.length} things to put right`}
      </p>
      <ul className="mt-1">
        {faults.map((fault) => (
          <li key={`${fault.fieldId}${fault.detail}`}>
            {fault.fieldId === null ? (
              fault.detail
            ) : (
              <a
                className="act-text inline-block py-0.5"
                href={`#${fault.fieldId}`}
                onClick={(event) => {
                  event.preventDefault();
                  document.getElementById(fault.fieldId!)?.focus();
                }}
              >
                {fault.detail}
              </a>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
