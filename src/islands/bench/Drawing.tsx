import { useState } from 'react';
import type { DipTable } from '~/domain/table/answer-at';
import { answerAt, safeFillMm } from '~/domain/table/answer-at';
import { levelOfReading } from '~/domain/table/level';
import type { Preview } from '~/domain/table/preview';
import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import { formatVolume } from '~/domain/units/format-volume';
import type { LengthUnit } from '~/domain/units/length-unit';
import { volumeUnitWords, type VolumeUnit } from '~/domain/units/volume-unit';
import type { View } from '~/viewport/projection';
import { UnitsChooser } from '../shared/UnitsChooser';
import { lengthScales, volumeScales } from '../stick/scales';
import { Stick, stickMarginPx } from '../stick/Stick';
import { StickTable } from '../table/StickTable';
import { Answer } from './Answer';
import { Picture } from './picture/Picture';
import { usePlate } from './use-plate';

interface DrawingProps {
  preview: Preview | null;
  table: DipTable | null;
  depthMm: number;
  onDepth(mm: number): void;
  levels: { unusable: number | null; safeFill: number | null };
  selected: string | null;
  onSelect(id: string): void;
  stands: string;
  length: LengthUnit;
  volume: VolumeUnit;
  name: string;
  /** Whose units are chosen here. */
  person: string;
}

const views: { name: 'end' | 'side' | 'plan' | 'away'; label: string }[] = [
  { name: 'end', label: 'End' },
  { name: 'side', label: 'Side' },
  { name: 'plan', label: 'Plan' },
  { name: 'away', label: 'Drawn away' },
];

/** Picture, stick and table at one scale, crossed by one wet line; the answer to their right. */
export function Drawing(props: DrawingProps) {
  const { preview, table, depthMm, onDepth, length, volume } = props;
  const [view, setView] = useState<View>({ name: 'away' });
  const { frame, plate } = usePlate(preview?.frame ?? null);
  const ready = preview && table && plate;
  const yOf = (mm: number) =>
    ready ? plate.railTop + plate.railPx * (1 - mm / table.heightMm) : 0;
  const wetY = yOf(depthMm);
  const upright = view.name === 'end' || view.name === 'side' || view.name === 'away';
  const spoken = table
    ? `${formatLengthWithUnit(depthMm, length)}, ${spokenVolume(table, depthMm, volume)}`
    : '';
  const fromY = (y: number) => {
    if (!ready) return;
    const share = 1 - (y - plate.railTop) / plate.railPx;
    onDepth(Math.min(table.heightMm, Math.max(0, Math.round(share * table.heightMm))));
  };

  return (
    <section aria-label="Drawing" className="relative px-4 pt-3 sm:px-6">
      <ViewChoice view={view} onView={setView} />
      <div className="grid grid-cols-[minmax(0,1fr)_auto] lg:grid-cols-[minmax(0,1fr)_auto_auto_13rem]">
        <div
          ref={frame}
          className="relative min-w-0"
          style={plate ? { height: plate.height } : { minHeight: 430 }}
        >
          {ready ? (
            <Picture
              preview={preview}
              plate={plate}
              view={view}
              onView={setView}
              levels={{
                wet: levelOfReading(preview.frame, depthMm),
                ...props.levels,
              }}
              wetY={upright ? wetY : null}
              onWetY={fromY}
              selected={props.selected}
              onSelect={props.onSelect}
              formatLength={(mm) => formatLength(mm, length)}
              spoken={`${viewWords(view)} of ${props.name}, liquid at ${spoken}`}
            />
          ) : (
            <p className="label pt-16" role="status">
              Drawing the tank …
            </p>
          )}
          {ready && (
            <WetLine y={wetY} text={formatLengthWithUnit(depthMm, length)} across={upright} />
          )}
        </div>
        {ready && (
          <div style={{ paddingTop: plate.railTop - stickMarginPx }}>
            <Stick
              heightMm={table.heightMm}
              curve={table.curve}
              depthMm={depthMm}
              onDepth={onDepth}
              unusableMm={table.settings.outletMm}
              safeFillMm={safeFillMm(table)}
              length={lengthScales[length]}
              volume={volumeScales[volume]}
              railPx={plate.railPx}
              keyStepMm={length === 'in' ? 25.4 / 8 : 1}
              spoken={spoken}
            />
          </div>
        )}
        {ready && (
          <div className="relative hidden pl-3 lg:block">
            <div
              aria-hidden="true"
              className="pointer-events-none absolute right-0 -left-3 z-10 h-0.5 -translate-y-1/2 bg-datum"
              style={{ top: wetY }}
            />
            <StickTable
              table={table}
              depthMm={depthMm}
              length={length}
              volume={volume}
              yOf={yOf}
              railPx={plate.railPx}
              heightPx={plate.height}
            />
          </div>
        )}
        {ready && (
          <div className="order-first col-span-2 pb-2 lg:order-none lg:col-span-1 lg:pt-16 lg:pl-5">
            <Answer
              table={table}
              depthMm={depthMm}
              onDepth={onDepth}
              stands={props.stands}
              length={length}
              volume={volume}
            />
            <div className="mt-6 hidden lg:block">
              <UnitsChooser person={props.person} />
            </div>
          </div>
        )}
      </div>
    </section>
  );
}

function ViewChoice({ view, onView }: { view: View; onView(view: View): void }) {
  return (
    <div role="group" aria-label="View" className="flex flex-wrap items-center gap-x-2">
      {views.map(({ name, label }, index) => {
        const chosen = view.name === name;
        return (
          <span key={name} className="flex items-center gap-x-2">
            {index > 0 && (
              <span aria-hidden="true" className="text-ink-2">
                ·
              </span>
            )}
            <button
              type="button"
              aria-pressed={chosen}
              className={`min-h-6 px-0.5 ${chosen ? 'font-bold' : ''}`}
              onClick={() => onView({ name })}
            >
              {label}
            </button>
          </span>
        );
      })}
      {view.name === 'free' && <span className="label">· turned freely</span>}
    </div>
  );
}

/** The wet line over the picture, with the reading on its flag beside the stick. */
function WetLine({ y, text, across }: { y: number; text: string; across: boolean }) {
  return (
    <div
      aria-hidden="true"
      className="pointer-events-none absolute right-0 left-0 z-10 flex -translate-y-1/2 items-center"
      style={{ top: y }}
    >
      <span className={`h-0.5 flex-1 ${across ? 'bg-datum' : ''}`} />
      <span className="flag bg-datum py-0.5 pr-4 pl-2 text-base font-bold text-sheet">{text}</span>
    </div>
  );
}

function viewWords(view: View): string {
  switch (view.name) {
    case 'end':
      return 'End view';
    case 'side':
      return 'Side view';
    case 'plan':
      return 'Plan';
    case 'away':
      return 'Drawn away view';
    case 'free':
      return 'View turned freely';
  }
}

function spokenVolume(table: DipTable, depthMm: number, volume: VolumeUnit): string {
  const answer = answerAt(table, depthMm);
  return `${formatVolume(answer.volumeL, volume, answer.plusMinusL)} ${volumeUnitWords[volume]}`;
}
