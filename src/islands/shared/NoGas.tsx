import { lpgRefusal } from '~/domain/liquid/liquids';

/** Beside every list of liquids: why a gas under pressure is not on it. */
export function NoGas() {
  return (
    <details className="text-note text-ink-2">
      <summary className="min-h-6 cursor-pointer">LPG or another gas under pressure?</summary>
      <span className="mt-1 block">{lpgRefusal}</span>
    </details>
  );
}
