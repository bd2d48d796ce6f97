import { useId } from 'react';

/** A tank from its side or its end, mm, as components/silhouette.ts draws it on the server. */
export interface SilhouetteDrawing {
  viewBox: string;
  hatchMm: number;
  holds: readonly string[];
  displaces: readonly string[];
}

/** A tank small, in ink: what holds liquid as one outline, what displaces it hatched. */
export function Silhouette({
  drawing,
  className,
}: {
  /** null: the tank is not drawn here, its place stays empty. */
  drawing: SilhouetteDrawing | null;
  className?: string;
}) {
  const id = useId();
  if (drawing === null) return <span className={className} />;
  const { hatchMm: h } = drawing;
  return (
    <svg
      viewBox={drawing.viewBox}
      className={className}
      preserveAspectRatio="xMidYMid meet"
      strokeLinejoin="round"
      aria-hidden="true"
    >
      <defs>
        <pattern
          id={`${id}h`}
          width={h}
          height={h}
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d={`M0 0V${h}`} className="stroke-ink-2" strokeWidth={h / 6} />
        </pattern>
        <clipPath id={`${id}c`}>
          {drawing.holds.map((d) => (
            <path key={d} d={d} />
          ))}
        </clipPath>
      </defs>
      {drawing.holds.map((d) => (
        <path
          key={d}
          d={d}
          className="fill-none stroke-ink"
          strokeWidth="3.4"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {drawing.holds.map((d) => (
        <path
          key={d}
          d={d}
          className="fill-wash stroke-wash"
          strokeWidth="1.2"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      <g clipPath={`url(#${id}c)`}>
        {drawing.displaces.map((d) => (
          <g key={d}>
            <path d={d} className="fill-sheet" />
            <path
              d={d}
              fill={`url(#${id}h)`}
              className="stroke-ink"
              strokeWidth="1"
              vectorEffect="non-scaling-stroke"
            />
          </g>
        ))}
      </g>
    </svg>
  );
}
