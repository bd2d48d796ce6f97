import type { Dimension } from './dimensions';

/** Along an upright dimension, from its foot. */
const figureShare = 0.68;

/** A dimension with oblique ticks, its figure standing along the line. */
export function DimensionLine({ dimension, text }: { dimension: Dimension; text: string }) {
  const { from, to, offset } = dimension;
  const a = [from[0] + offset[0], from[1] + offset[1]] as const;
  const b = [to[0] + offset[0], to[1] + offset[1]] as const;
  const lengthPx = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (lengthPx < 28) return null;
  // a standing figure keeps off the middle, where the wet line stands at first
  const upright = Math.abs(b[1] - a[1]) > 2 * Math.abs(b[0] - a[0]);
  const share = upright ? figureShare : 0.5;
  const middle = [a[0] + share * (b[0] - a[0]), a[1] + share * (b[1] - a[1])];
  let angle = (Math.atan2(b[1] - a[1], b[0] - a[0]) * 180) / Math.PI;
  if (angle > 90 || angle < -90) angle += 180;
  const witness = (p: readonly [number, number], q: readonly [number, number]) => {
    const size = Math.hypot(q[0] - p[0], q[1] - p[1]) || 1;
    const ux = (q[0] - p[0]) / size;
    const uy = (q[1] - p[1]) / size;
    return `M${p[0] + 5 * ux} ${p[1] + 5 * uy}L${q[0] + 4 * ux} ${q[1] + 4 * uy}`;
  };
  return (
    <g className="stroke-line" strokeWidth="0.9" fill="none">
      <path d={`${witness(from, a)}${witness(to, b)}`} className="stroke-hair" />
      <path d={`M${a[0]} ${a[1]}L${b[0]} ${b[1]}`} />
      <path
        d={`M${a[0] - 5} ${a[1] + 5}l10 -10M${b[0] - 5} ${b[1] + 5}l10 -10`}
        className="stroke-ink-2"
      />
      <text
        transform={`translate(${middle[0]} ${middle[1]}) rotate(${angle})`}
        y="-5"
        textAnchor="middle"
        stroke="none"
        className="fill-ink-2 text-note"
      >
        {text}
      </text>
    </g>
  );
}
