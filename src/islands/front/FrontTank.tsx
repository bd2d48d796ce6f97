import { useEffect, useId, useMemo, useRef, useState, type PointerEvent } from 'react';
import { curveFromRows, depthAt, volumeAt } from '~/domain/table/curve';
import type { Preview } from '~/domain/table/preview';
import { formatNumber } from '~/domain/units/format-number';
import { formatPlusMinus, formatVolume } from '~/domain/units/format-volume';
import type { Plate } from '~/viewport/projection';
import { useAwake } from '../shared/use-awake';
import { lengthScales, volumeScales } from '../stick/scales';
import { Stick, leftScalePx, railWidthPx, stickMarginPx } from '../stick/Stick';
import { carryDraft } from './carried-draft';
import { HullDrawing } from './HullDrawing';
import { HullSizesFields } from './HullSizesFields';
import { usePreview } from './use-preview';
import { firstHull, vHull } from './v-hull';

const safeFillPercent = 95;
/** A dip is read to this, mm. */
const dipPlusMinusMm = 2;
const stickPx = leftScalePx + railWidthPx + 10;

/** The front page's tank: a real hull-shaped tank, computed in the browser while it is dragged and changed. */
export function FrontTank({ signedIn }: { signedIn: boolean }) {
  const [sizes, setSizes] = useState(firstHull);
  const design = useMemo(() => vHull(sizes), [sizes]);
  const { preview, fault } = usePreview(design);
  const [share, setShare] = useState(0.5);
  const awake = useAwake();
  const [uncarried, setUncarried] = useState(false);

  function modelYourOwn(): void {
    if (!carryDraft(design)) setUncarried(true);
    else window.location.assign(signedIn ? '/home#new-tank' : '/sign-up');
  }
  return (
    <div className="grid gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,1fr)_21rem]">
      {preview ? (
        <DrawnTank preview={preview} share={share} onShare={setShare} />
      ) : (
        <p className="grid min-h-84 place-content-center text-ink-2 sm:min-h-120" role="status">
          {fault ?? 'Computing the tank…'}
        </p>
      )}
      <div className="grid content-start gap-5 lg:pt-16">
        {preview && <Litres preview={preview} share={share} />}
        <HullSizesFields sizes={sizes} onSizes={setSizes} />
        {preview && fault && <p className="fault">{fault}</p>}
        <div>
          <button
            type="button"
            className="act min-h-11 w-full text-lead sm:w-auto"
            disabled={!awake}
            onClick={modelYourOwn}
          >
            Model your own
          </button>
          <p className="label mt-2">
            {signedIn
              ? 'This hull comes along as a draft.'
              : 'This hull comes along; the account takes a minute.'}
          </p>
          {uncarried && (
            <p role="alert" className="fault mt-2">
              This browser keeps nothing, so the hull cannot come along.{' '}
              <a href="/sign-up">Open a workshop</a> and choose “V hull” there.
            </p>
          )}
        </div>
      </div>
    </div>
  );
}

function useCurve(preview: Preview) {
  return useMemo(() => curveFromRows(preview.rows, preview.frame.levelPerReading), [preview]);
}

function DrawnTank({
  preview,
  share,
  onShare,
}: {
  preview: Preview;
  share: number;
  onShare(share: number): void;
}) {
  const prefix = useId();
  const box = useRef<HTMLDivElement>(null);
  const width = useWidth(box);
  const curve = useCurve(preview);
  const { heightMm } = preview.frame;
  const narrow = width < 560;
  const plate = useMemo<Plate>(() => {
    const [railTop, railPx] = narrow ? [62, 250] : [92, 380];
    return {
      width: Math.max(120, Math.min(width - stickPx - 8, 760)),
      height: railTop + railPx + stickMarginPx,
      railTop,
      railPx,
      marginX: 6,
    };
  }, [width, narrow]);
  const readingMm = share * heightMm;
  const y = plate.railTop + plate.railPx * (1 - share);
  const safeFill = (safeFillPercent / 100) * preview.capacityL;
  const litres = volumeAt(curve, readingMm);
  const spoken = `${formatNumber(readingMm, 0)} mm, ${formatNumber(litres, 1)} litres`;

  const follow = (event: PointerEvent<HTMLDivElement>) => {
    const top = event.currentTarget.getBoundingClientRect().top;
    const next = 1 - (event.clientY - top - plate.railTop) / plate.railPx;
    onShare(Math.round(Math.min(1, Math.max(0, next)) * heightMm) / heightMm);
  };
  return (
    <div ref={box} className="relative min-h-84 sm:min-h-120">
      {width > 0 && (
        <>
          <div
            className="absolute top-0 left-0 cursor-ns-resize sm:touch-none"
            onPointerDown={(event) => {
              event.currentTarget.setPointerCapture(event.pointerId);
              follow(event);
            }}
            onPointerMove={(event) => {
              if (event.currentTarget.hasPointerCapture(event.pointerId)) follow(event);
            }}
          >
            <HullDrawing
              preview={preview}
              readingMm={readingMm}
              unusableMm={0}
              safeFillMm={safeFill < preview.capacityL ? depthAt(curve, safeFill) : null}
              plate={plate}
              prefix={prefix}
            />
          </div>
          <div
            className="absolute"
            style={{ left: plate.width + 8, top: plate.railTop - stickMarginPx }}
          >
            <Stick
              heightMm={heightMm}
              curve={curve}
              depthMm={readingMm}
              onDepth={(mm) => onShare(mm / heightMm)}
              unusableMm={null}
              safeFillMm={depthAt(curve, safeFill)}
              length={lengthScales.mm}
              volume={volumeScales.l}
              railPx={plate.railPx}
              keyStepMm={1}
              spoken={spoken}
              grip={narrow}
            />
          </div>
          <WetLine
            width={plate.width + stickPx}
            height={plate.height}
            end={plate.width - 2}
            y={y}
            reading={`${formatNumber(readingMm, 0)} mm`}
          />
        </>
      )}
    </div>
  );
}

/** One straight line through the liquid and the stick, with what was read on it. */
function WetLine(props: {
  width: number;
  height: number;
  end: number;
  y: number;
  reading: string;
}) {
  const { y, end } = props;
  return (
    <svg
      className="pointer-events-none absolute top-0 left-0 overflow-visible"
      width={props.width}
      height={props.height}
      aria-hidden="true"
    >
      <path d={`M0 ${y}H${props.width - 4}`} className="stroke-datum" strokeWidth="1.75" />
      <path d={`M${end - 68} ${y - 11}h58l10 11l-10 11h-58z`} className="fill-datum" />
      <text
        x={end - 36}
        y={y + 5}
        textAnchor="middle"
        className="fill-sheet text-base font-semibold"
      >
        {props.reading}
      </text>
    </svg>
  );
}

function Litres({ preview, share }: { preview: Preview; share: number }) {
  const curve = useCurve(preview);
  const readingMm = share * preview.frame.heightMm;
  const litres = volumeAt(curve, readingMm);
  const low = volumeAt(curve, Math.max(0, readingMm - dipPlusMinusMm));
  const high = volumeAt(curve, Math.min(preview.frame.heightMm, readingMm + dipPlusMinusMm));
  const plusMinusL = Math.max(litres - low, high - litres, 0.05);
  return (
    <div>
      <p className="text-huge font-bold whitespace-nowrap">
        {formatVolume(litres, 'l', plusMinusL)}{' '}
        <span className="text-[0.5em] font-semibold">L</span>
      </p>
      <p className="mt-1 text-lead">
        in the tank, ± {formatPlusMinus(plusMinusL, 'l')} for a dip read to ± {dipPlusMinusMm} mm
      </p>
      <p className="mt-3 text-lead font-semibold">
        {formatNumber(share * 100, 0)} % of the stick is{' '}
        {formatNumber((litres / preview.capacityL) * 100, 0)} % of the tank.
      </p>
      <p className="text-ink-2">Brim, computed: {formatNumber(preview.capacityL, 1)} L</p>
    </div>
  );
}

/** Width of an element, px; 0 until it was measured. */
function useWidth(box: React.RefObject<HTMLElement | null>): number {
  const [width, setWidth] = useState(0);
  useEffect(() => {
    const element = box.current!;
    const observer = new ResizeObserver(() => setWidth(Math.floor(element.clientWidth)));
    observer.observe(element);
    return () => observer.disconnect();
  }, [box]);
  return width;
}
