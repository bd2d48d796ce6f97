/**
 * The patterns by which regions of a tank are told apart, the same everywhere: usable plain tint,
 * unusable cross-hatch, headroom sparse dots, deadwood diagonal rule. Drawn in ink, so that a
 * photocopy or a colour-blind reader loses nothing.
 */
export function Patterns({ prefix }: { prefix: string }) {
  return (
    <defs>
      <pattern id={`${prefix}-unusable`} width="8" height="8" patternUnits="userSpaceOnUse">
        <path d="M0 0L8 8M8 0L0 8" className="stroke-ink-2" strokeWidth="0.8" fill="none" />
      </pattern>
      <pattern id={`${prefix}-headroom`} width="10" height="10" patternUnits="userSpaceOnUse">
        <circle cx="2.5" cy="2.5" r="0.8" className="fill-ink-2" />
        <circle cx="7.5" cy="7.5" r="0.8" className="fill-ink-2" />
      </pattern>
      <pattern id={`${prefix}-deadwood`} width="6" height="6" patternUnits="userSpaceOnUse">
        <path d="M-1 7L7 -1" className="stroke-line" strokeWidth="0.8" fill="none" />
      </pattern>
    </defs>
  );
}
