interface SketchPoint {
  across: number;
  up: number;
  radius?: number | undefined;
}

interface OutlineSketchProps {
  label: string;
  /** mm; once round. */
  points: readonly SketchPoint[];
  /** Outlines that stand behind, in hair lines. */
  behind?: readonly (readonly SketchPoint[])[];
  chosen: number | null;
}

type Px = readonly [number, number];

const width = 240;
const height = 190;
const margin = 26;

/** An outline as it is typed, its points numbered, the chosen one marked. */
export function OutlineSketch({ label, points, behind = [], chosen }: OutlineSketchProps) {
  const all = [points, ...behind].flat();
  const [left, right] = rangeOf(all.map(({ across }) => across));
  const [low, high] = rangeOf(all.map(({ up }) => up));
  const scale = Math.min(
    (width - 2 * margin) / Math.max(right - left, 1e-6),
    (height - 2 * margin) / Math.max(high - low, 1e-6),
  );
  const middle = [(left + right) / 2, (low + high) / 2] as const;
  const place = ({ across, up }: SketchPoint): Px => [
    width / 2 + scale * (across - middle[0]),
    height / 2 - scale * (up - middle[1]),
  ];
  const corners = points.map(place);
  // numbers that would crowd are left out, the chosen one never
  const every = Math.ceil(points.length / 16);
  return (
    <figure className="m-0 w-60 max-w-full flex-none">
      <svg
        role="img"
        aria-label={`${label}: ${points.length} points${chosen === null ? '' : `, point ${chosen + 1} chosen`}`}
        viewBox={`0 0 ${width} ${height}`}
        className="block w-full fill-none stroke-current"
      >
        {behind.map((outline, i) => (
          <path
            key={i}
            d={pathOf(outline.map(place), [])}
            className="stroke-line"
            strokeWidth="0.75"
          />
        ))}
        <path
          d={pathOf(
            corners,
            points.map(({ radius = 0 }) => radius * scale),
          )}
          strokeWidth="1.5"
          strokeLinejoin="round"
        />
        {corners.map(([x, y], i) => {
          const [dx, dy] = outwards(corners, i);
          const marked = i === chosen;
          return (
            <g key={i} stroke="none">
              <circle cx={x} cy={y} r={marked ? 4 : 2} className="fill-ink" />
              {(marked || i % every === 0) && (
                <text
                  x={x + 13 * dx}
                  y={y + 13 * dy}
                  textAnchor="middle"
                  dominantBaseline="central"
                  className={`text-note ${marked ? 'fill-ink font-bold' : 'fill-ink-2'}`}
                >
                  {i + 1}
                </text>
              )}
            </g>
          );
        })}
      </svg>
    </figure>
  );
}

function rangeOf(values: readonly number[]): [number, number] {
  return [Math.min(...values), Math.max(...values)];
}

/** Straight from corner to corner, those with a radius rounded where it fits on their sides. */
function pathOf(corners: readonly Px[], radii: readonly number[]): string {
  const n = corners.length;
  const parts = corners.map((corner, i) => {
    const radius = radii[i] ?? 0;
    const [before, after] = [corners[(i + n - 1) % n]!, corners[(i + 1) % n]!];
    const [ux, uy, toBefore] = direction(corner, before);
    const [vx, vy, toAfter] = direction(corner, after);
    // half the angle between the two sides
    const half = Math.acos(Math.max(-1, Math.min(1, ux * vx + uy * vy))) / 2;
    const reach = radius / Math.tan(half);
    if (!(radius > 0) || !(reach <= Math.min(toBefore, toAfter))) return corner.join(' ');
    const sweep = ux * vy - uy * vx < 0 ? 1 : 0;
    const from = `${corner[0] + reach * ux} ${corner[1] + reach * uy}`;
    const to = `${corner[0] + reach * vx} ${corner[1] + reach * vy}`;
    return `${from}A${radius} ${radius} 0 0 ${sweep} ${to}`;
  });
  return `M${parts.join('L')}Z`;
}

/** Unit vector from one place to another, and how far it is. */
function direction(from: Px, to: Px): [number, number, number] {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(dx, dy) || 1;
  return [dx / length, dy / length, length];
}

/** Where a corner's number stands free of its sides: away from both, whichever way round the outline runs. */
function outwards(corners: readonly Px[], i: number): [number, number] {
  const n = corners.length;
  const corner = corners[i]!;
  const [ux, uy] = direction(corner, corners[(i + n - 1) % n]!);
  const [vx, vy] = direction(corner, corners[(i + 1) % n]!);
  const [x, y] = [ux + vx, uy + vy];
  const length = Math.hypot(x, y);
  // straight on: square to the side
  return length < 0.1 ? [uy, -ux] : [-x / length, -y / length];
}
