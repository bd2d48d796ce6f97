import { useId, useRef, type KeyboardEvent, type PointerEvent } from 'react';
import { depthAt, type Curve } from '~/domain/table/curve';
import { marksFor, multiples } from '~/domain/units/marks';
import { Patterns } from './Patterns';
import { volumeMarks } from './volume-marks';

/** A unit of the scale: how much of the SI unit it is, and how a mark is written in it. */
export interface Scale {
  /** Millimetres (lengths) or litres (volumes) to one of this unit. */
  per: number;
  label: string;
  eighths?: boolean;
}

export interface StickProps {
  /** Highest reading, mm. */
  heightMm: number;
  /** Litres by depth, for the right-hand scale. */
  curve: Curve;
  /** Where the wet line stands, mm from zero. null: nothing was read yet. */
  depthMm: number | null;
  onDepth(depthMm: number): void;
  /** Reading below which nothing can be drawn; null when no outlet was told. */
  unusableMm: number | null;
  /** Reading at safe fill. */
  safeFillMm: number | null;
  length: Scale;
  volume: Scale;
  /** Height of the rail on the screen, px. */
  railPx: number;
  /** What a press of an arrow key moves, mm. Shift moves ten times as far. */
  keyStepMm: number;
  /** How the reading is spoken: "150 mm, 55.5 litres". */
  spoken: string;
  /** A round grip on the rail, for thumbs. */
  grip?: boolean;
}

export const railWidthPx = 46;
export const leftScalePx = 44;
/** Room above and below the rail for the end marks and the grip. */
export const stickMarginPx = 20;

/**
 * The stick: the graduated rail with its wet line. Depth from zero on the left, litres inside.
 * Dragged by pointer, moved by arrow keys (Page for ten, Home and End for the ends).
 */
export function Stick(props: StickProps) {
  const { heightMm, depthMm, railPx, onDepth, keyStepMm } = props;
  const prefix = useId();
  const svg = useRef<SVGSVGElement>(null);
  const yOf = (mm: number) => stickMarginPx + railPx * (1 - mm / heightMm);
  const wetY = depthMm === null ? null : yOf(depthMm);
  const clamp = (mm: number) => Math.min(heightMm, Math.max(0, mm));

  const follow = (event: PointerEvent) => {
    const box = svg.current!.getBoundingClientRect();
    const share = 1 - (event.clientY - box.top - stickMarginPx) / railPx;
    const fine = heightMm > 2 * railPx ? 1 : 0.5;
    onDepth(clamp(Math.round((share * heightMm) / fine) * fine));
  };
  const press = (event: KeyboardEvent) => {
    const target = keyTarget(event, depthMm ?? 0, keyStepMm, heightMm);
    if (target === null) return;
    event.preventDefault();
    onDepth(clamp(target));
  };

  return (
    <svg
      ref={svg}
      width={leftScalePx + railWidthPx + 10}
      height={railPx + 2 * stickMarginPx}
      className="touch-none select-none overflow-visible"
      role="slider"
      tabIndex={0}
      aria-label="Wet line on the stick"
      aria-orientation="vertical"
      aria-valuemin={0}
      aria-valuemax={heightMm}
      aria-valuenow={depthMm ?? 0}
      aria-valuetext={props.spoken}
      onKeyDown={press}
      onPointerDown={(event) => {
        event.currentTarget.setPointerCapture(event.pointerId);
        event.currentTarget.focus({ preventScroll: true });
        follow(event);
      }}
      onPointerMove={(event) => {
        if (event.currentTarget.hasPointerCapture(event.pointerId)) follow(event);
      }}
    >
      <Patterns prefix={prefix} />
      <Rail {...props} prefix={prefix} yOf={yOf} />
      <LengthMarks heightMm={heightMm} scale={props.length} railPx={railPx} yOf={yOf} wetY={wetY} />
      <VolumeMarks
        heightMm={heightMm}
        curve={props.curve}
        scale={props.volume}
        yOf={yOf}
        wetY={wetY}
      />
      {wetY !== null && <WetLine y={wetY} grip={props.grip === true} />}
    </svg>
  );
}

function keyTarget(event: KeyboardEvent, depthMm: number, step: number, top: number) {
  const stride = event.shiftKey ? 10 * step : step;
  switch (event.key) {
    case 'ArrowUp':
    case 'ArrowRight':
      return depthMm + stride;
    case 'ArrowDown':
    case 'ArrowLeft':
      return depthMm - stride;
    case 'PageUp':
      return depthMm + 10 * step;
    case 'PageDown':
      return depthMm - 10 * step;
    case 'Home':
      return 0;
    case 'End':
      return top;
    default:
      return null;
  }
}

type Drawn = StickProps & { prefix: string; yOf(mm: number): number };

function Rail({ prefix, yOf, heightMm, depthMm, unusableMm, safeFillMm }: Drawn) {
  const x = leftScalePx;
  const band = (lowMm: number, highMm: number, className: string, fill?: string) => (
    <rect
      x={x}
      y={yOf(highMm)}
      width={railWidthPx}
      height={Math.max(0, yOf(lowMm) - yOf(highMm))}
      className={className}
      {...(fill ? { fill } : {})}
    />
  );
  return (
    <g>
      {band(0, heightMm, 'fill-sheet')}
      {depthMm !== null && band(0, depthMm, 'fill-wash')}
      {unusableMm !== null &&
        unusableMm > 0 &&
        band(0, Math.min(unusableMm, heightMm), '', `url(#${prefix}-unusable)`)}
      {safeFillMm !== null &&
        safeFillMm < heightMm &&
        band(safeFillMm, heightMm, '', `url(#${prefix}-headroom)`)}
      <rect
        x={x}
        y={yOf(heightMm)}
        width={railWidthPx}
        height={yOf(0) - yOf(heightMm)}
        fill="none"
        className="stroke-ink"
        strokeWidth="1.75"
      />
    </g>
  );
}

function LengthMarks(props: {
  heightMm: number;
  scale: Scale;
  railPx: number;
  yOf(mm: number): number;
  wetY: number | null;
}) {
  const { heightMm, scale, railPx, yOf, wetY } = props;
  const span = heightMm / scale.per;
  const { numbered, fine } = marksFor(span, railPx / 36, railPx / 5, scale.eighths);
  const isNumbered = (value: number) =>
    Math.abs(value / numbered - Math.round(value / numbered)) < 1e-6;
  return (
    <g>
      <text x={leftScalePx - 8} y={8} textAnchor="end" className="fill-ink-2 text-note">
        {scale.label}
      </text>
      {multiples(fine, span).map((value) => {
        const y = yOf(value * scale.per);
        const long = isNumbered(value);
        return (
          <g key={value}>
            <path
              d={`M${leftScalePx} ${y}h${long ? 14 : 7}`}
              className="stroke-ink"
              strokeWidth={long ? 1.25 : 0.75}
            />
            {long && !struckOut(y, wetY) && (
              <text x={leftScalePx - 8} y={y + 4.5} textAnchor="end" className="fill-ink text-note">
                {trim(value)}
              </text>
            )}
          </g>
        );
      })}
    </g>
  );
}

function VolumeMarks(props: {
  heightMm: number;
  curve: Curve;
  scale: Scale;
  yOf(mm: number): number;
  wetY: number | null;
}) {
  const { heightMm, curve, scale, yOf, wetY } = props;
  const right = leftScalePx + railWidthPx;
  const most = curve.volumeL[curve.volumeL.length - 1] ?? 0;
  const least = curve.volumeL[0] ?? 0;
  const span = most / scale.per;
  if (!(span > 0)) return null;
  const marks = volumeMarks(
    least / scale.per,
    span,
    (value) => yOf(depthAt(curve, value * scale.per)),
    yOf(heightMm) + 9,
  );
  return (
    <g>
      <text x={right - 2} y={8} textAnchor="end" className="fill-ink-2 text-note">
        {scale.label}
      </text>
      {marks.map(({ value, y }) => (
        <g key={value}>
          <path d={`M${right} ${y}h-9`} className="stroke-ink" strokeWidth="1" />
          {!struckOut(y, wetY) && (
            <text x={right - 12} y={y + 4} textAnchor="end" className="fill-ink-2 text-[0.6875rem]">
              {trim(value)}
            </text>
          )}
        </g>
      ))}
    </g>
  );
}

/** The wet line runs through whole: a number that it would strike out gives way. */
function struckOut(y: number, wetY: number | null): boolean {
  return wetY !== null && Math.abs(y - wetY) < 8;
}

function WetLine({ y, grip }: { y: number; grip: boolean }) {
  const middle = leftScalePx + railWidthPx / 2;
  return (
    <g className="cursor-ns-resize">
      <path
        d={`M0 ${y}h${leftScalePx + railWidthPx + 12}`}
        className="stroke-datum"
        strokeWidth="2"
      />
      {grip && (
        <g>
          <circle cx={middle} cy={y} r="17" className="fill-datum" />
          <path
            d={`M${middle - 5} ${y - 4}l5 -5l5 5M${middle - 5} ${y + 4}l5 5l5 -5`}
            className="stroke-sheet"
            strokeWidth="1.75"
            fill="none"
          />
        </g>
      )}
    </g>
  );
}

function trim(value: number): string {
  const text = Number(value.toFixed(3)).toString();
  return Math.abs(value) >= 10_000 ? text.replace(/\B(?=(\d{3})+$)/g, '\u2009') : text;
}
