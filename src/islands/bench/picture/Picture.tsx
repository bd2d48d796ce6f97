import { lazy, Suspense, useMemo, useRef, type PointerEvent } from 'react';
import type { Preview } from '~/domain/table/preview';
import { project, type Plate, type View } from '~/viewport/projection';
import { balloonRadius, balloonsOf } from './balloons';
import { DimensionLine } from './DimensionLine';
import { dimensionsOf } from './dimensions';

const TankCanvas = lazy(() => import('~/viewport/TankCanvas'));

interface PictureProps {
  preview: Preview;
  plate: Plate;
  view: View;
  onView(view: View): void;
  levels: {
    wet: number | null;
    unusable: number | null;
    safeFill: number | null;
  };
  /** y of the wet line on the plate, px; null in views where it is no line. */
  wetY: number | null;
  onWetY(y: number): void;
  selected: string | null;
  onSelect(id: string): void;
  formatLength(mm: number): string;
  spoken: string;
}

const reachPx = 14;

/** The picture: the drawn tank with its dimensions and balloons. The wet line can be dragged here too. */
export function Picture(props: PictureProps) {
  const { preview, plate, view, onView, levels, wetY, onWetY, selected, onSelect } = props;
  const projection = useMemo(
    () => project(preview.space, preview.frame, view, plate),
    [preview, view, plate],
  );
  const dimensions = useMemo(
    () => dimensionsOf(preview.extent, view, projection),
    [preview.extent, view, projection],
  );
  const balloons = useMemo(
    () => balloonsOf(preview, projection, plate),
    [preview, projection, plate],
  );
  const drag = useRef<null | { kind: 'wet' } | { kind: 'turn'; x: number; y: number; from: View }>(
    null,
  );

  const down = (event: PointerEvent<SVGSVGElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    const y = event.clientY - box.top;
    const onWet = wetY !== null && Math.abs(y - wetY) <= reachPx;
    const turns = view.name === 'away' || view.name === 'free';
    if (!onWet && !turns) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    drag.current = onWet
      ? { kind: 'wet' }
      : { kind: 'turn', x: event.clientX, y: event.clientY, from: view };
  };
  const move = (event: PointerEvent<SVGSVGElement>) => {
    const current = drag.current;
    if (!current) return;
    if (current.kind === 'wet') {
      onWetY(event.clientY - event.currentTarget.getBoundingClientRect().top);
      return;
    }
    const from = current.from.name === 'free' ? current.from : { azimuth: -24, elevation: 22 };
    const dx = event.clientX - current.x;
    const dy = event.clientY - current.y;
    if (current.from.name !== 'free' && Math.hypot(dx, dy) < 4) return;
    onView({
      name: 'free',
      azimuth: from.azimuth - dx * 0.4,
      elevation: Math.min(89, Math.max(-20, from.elevation + dy * 0.4)),
    });
  };
  const up = () => {
    drag.current = null;
  };

  return (
    <div className="relative h-full w-full" role="img" aria-label={props.spoken}>
      <Suspense fallback={null}>
        <TankCanvas
          preview={preview}
          plate={plate}
          projection={projection}
          levels={levels}
          selected={selected}
        />
      </Suspense>
      <svg
        className="absolute inset-0 touch-pan-y select-none"
        width={plate.width}
        height={plate.height}
        onPointerDown={down}
        onPointerMove={move}
        onPointerUp={up}
        onPointerCancel={up}
        aria-hidden="true"
      >
        {dimensions.map((dimension, index) => (
          <DimensionLine
            key={index}
            dimension={dimension}
            text={props.formatLength(dimension.lengthMm)}
          />
        ))}
        {balloons.map((balloon) => (
          <g
            key={balloon.id}
            className="cursor-pointer"
            onPointerDown={(event) => {
              event.stopPropagation();
              onSelect(balloon.id);
            }}
          >
            <path
              d={leader(balloon.centre, balloon.anchor)}
              className="stroke-ink-2"
              strokeWidth="0.9"
              fill="none"
            />
            <circle cx={balloon.anchor[0]} cy={balloon.anchor[1]} r="2" className="fill-ink" />
            <circle
              cx={balloon.centre[0]}
              cy={balloon.centre[1]}
              r={balloonRadius}
              className={balloon.id === selected ? 'fill-ink stroke-ink' : 'fill-film stroke-ink'}
              strokeWidth="1.1"
            />
            <text
              x={balloon.centre[0]}
              y={balloon.centre[1] + 4.5}
              textAnchor="middle"
              className={`text-note font-semibold ${balloon.id === selected ? 'fill-film' : 'fill-ink'}`}
            >
              {balloon.number}
            </text>
          </g>
        ))}
        {projection.shortened && (
          <text x={12} y={plate.height - 8} className="fill-ink-2 text-note">
            Lengths across are drawn shorter, to fit.
          </text>
        )}
        {wetY !== null && (
          <rect
            x="0"
            y={wetY - reachPx}
            width={plate.width}
            height={2 * reachPx}
            fill="transparent"
            className="cursor-ns-resize touch-none"
          />
        )}
      </svg>
    </div>
  );
}

function leader(centre: [number, number], anchor: [number, number]): string {
  const dx = anchor[0] - centre[0];
  const dy = anchor[1] - centre[1];
  const size = Math.hypot(dx, dy) || 1;
  return `M${centre[0] + (dx / size) * balloonRadius} ${centre[1] + (dy / size) * balloonRadius}L${anchor[0]} ${anchor[1]}`;
}
