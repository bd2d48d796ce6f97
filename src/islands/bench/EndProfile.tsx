import type { End } from '~/domain/tank/kinds/cylinder/schema';
import type { Which } from '~/scene/cylinder-ends';

interface EndProfileProps {
  end: End;
  diameterMm: number;
  axis: 'x' | 'y' | 'z';
  which: Which;
}

const middle = 12;
const radiusPx = 10;

/** An end as a workshop drawing has it, in section along the axis and to scale unless it is very deep: 24 px high. */
export function EndProfile({ end, diameterMm, axis, which }: EndProfileProps) {
  const mouth = end.inward ? 22 : 9;
  const turn = axis === 'z' ? (which === 0 ? 90 : -90) : which === 0 ? 180 : 0;
  const [top, bottom] = [middle - radiusPx, middle + radiusPx];
  return (
    <svg
      aria-hidden="true"
      viewBox="0 0 24 24"
      className="size-6 shrink-0"
      fill="none"
      stroke="currentColor"
    >
      <g transform={`rotate(${turn} 12 12)`}>
        <path d="M0.5 12H23.5" strokeWidth="0.6" strokeDasharray="6 1.5 1 1.5" />
        {end.form !== 'flat' && !end.inward && (
          <path d={`M${mouth} ${top}V${bottom}`} strokeWidth="0.6" />
        )}
        <path
          d={`M1 ${top}H${mouth}${across(end, (2 * radiusPx) / diameterMm, mouth, bottom)}H1`}
          strokeWidth="1.4"
          strokeLinejoin="round"
        />
      </g>
    </svg>
  );
}

/** From the upper corner of the mouth over the end to the lower one. */
function across(end: End, pxPerMm: number, mouth: number, bottom: number): string {
  const back = `${mouth} ${bottom}`;
  const out = end.inward ? -1 : 1;
  const sweep = end.inward ? 0 : 1;
  const fit = (depthMm: number) => Math.min(depthMm * pxPerMm, 14);
  const arc = (across: number, along: number, to: string) =>
    `A${along} ${across} 0 0 ${sweep} ${to}`;
  switch (end.form) {
    case 'flat':
      return `L${back}`;
    case 'cone':
      return `L${mouth + out * fit(end.depth)} ${middle}L${back}`;
    case 'ellipsoid':
      return arc(radiusPx, fit(end.depth), back);
    case 'dish': {
      const depth = Math.min(fit(end.depth), radiusPx);
      const sphere = (radiusPx * radiusPx + depth * depth) / (2 * depth);
      return arc(sphere, sphere, back);
    }
    case 'torisphere': {
      // sizes that do not fit each other are drawn as the nearest that do; the fault stands beside them
      const crown = Math.max(end.crown * pxPerMm, radiusPx * 1.001);
      const knuckle = Math.min(end.knuckle * pxPerMm, radiusPx * 0.98);
      const off = (radiusPx - knuckle) / (crown - knuckle);
      const seamAcross = crown * off;
      const seamAlong = out * knuckle * Math.sqrt(1 - off * off);
      const seam = (side: 1 | -1) => `${mouth + seamAlong} ${middle + side * seamAcross}`;
      return (
        arc(knuckle, knuckle, seam(-1)) + arc(crown, crown, seam(1)) + arc(knuckle, knuckle, back)
      );
    }
  }
}
