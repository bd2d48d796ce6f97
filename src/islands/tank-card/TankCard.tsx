import { useMemo, useState } from 'react';
import { liquids } from '~/domain/liquid/liquids';
import type { Reading } from '~/domain/reading/reading';
import { answerAt, safeFillMm, type DipTable } from '~/domain/table/answer-at';
import { curveFromRows } from '~/domain/table/curve';
import type { TankSettings } from '~/domain/tank/settings';
import { formatLength, formatLengthWithUnit } from '~/domain/units/format-length';
import { formatVolume } from '~/domain/units/format-volume';
import { volumeUnitSigns } from '~/domain/units/volume-unit';
import { lengthScales, volumeScales } from '../stick/scales';
import { Stick } from '../stick/Stick';
import { UnitsChooser } from '../shared/UnitsChooser';
import { useUnitsPreference } from '../shared/units-preference';
import { AnswerBlock } from './AnswerBlock';
import { readDip, type DipMeans } from './dip';
import { DipField } from './DipField';
import { unpackRows } from './packed-rows';
import { ReadingsBlock } from './ReadingsBlock';
import { useReadings } from './use-readings';

export interface TankCardProps {
  tankId: string;
  /** Whose units are remembered. */
  person: string;
  revision: { letter: string; heightMm: number; capacityL: number };
  /** As frozen into the revision. */
  settings: TankSettings;
  /** Issued rows, see packed-rows.ts. */
  rows: string;
  /** dLevel/dReading: 1 unless the tank stands tilted. */
  slopeFactor: number;
  readings: readonly Reading[];
  mayKeep: boolean;
}

/** The owner's look-up: one field and the stick, the answer at each keystroke from the issued rows. */
export function TankCard(props: TankCardProps) {
  const { revision, settings, person } = props;
  const table = useIssuedTable(props);
  const [units] = useUnitsPreference(person);
  const [means, setMeans] = useState<DipMeans>('depth');
  const [text, setText] = useState('');
  const readings = useReadings(props.tankId, props.readings);
  const dip = readDip(text, means, units.length, revision.heightMm);
  const answer = dip.is === 'read' ? answerAt(table, dip.depthMm) : null;

  const drag = (depthMm: number) =>
    setText(
      formatLength(
        means === 'depth' ? depthMm : revision.heightMm - depthMm,
        units.length,
        dragDecimals[units.length],
      ),
    );
  const switchMeans = (next: DipMeans) => {
    setMeans(next);
    // the liquid did not move: the same level, measured the other way
    if (dip.is === 'read' && next !== means) {
      setText(
        formatLength(
          next === 'depth' ? dip.depthMm : revision.heightMm - dip.depthMm,
          units.length,
        ),
      );
    }
  };
  const waste = liquids[settings.liquid].watch === 'high';
  const spoken = answer
    ? `${formatLengthWithUnit(answer.depthMm, units.length)}, ${formatVolume(waste ? answer.roomL : answer.usableL, units.volume, answer.plusMinusL)} ${volumeUnitSigns[units.volume]} ${waste ? 'room' : 'usable'}`
    : 'nothing read yet';

  return (
    <div className="grid gap-8 lg:grid-cols-2 lg:gap-16">
      <div className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-3">
        <div className="grid content-start gap-6">
          <DipField
            text={text}
            means={means}
            unit={units.length}
            dip={dip}
            onText={setText}
            onMeans={switchMeans}
          />
          {answer ? (
            <AnswerBlock answer={answer} settings={settings} unit={units.volume} />
          ) : (
            <p className="text-ink-2">
              {dip.is === 'asked-back'
                ? 'No litres are given for a reading off the stick.'
                : 'Type what the stick says, or drag the line on it.'}
            </p>
          )}
        </div>
        <Stick
          heightMm={revision.heightMm}
          curve={table.curve}
          depthMm={answer?.depthMm ?? null}
          onDepth={drag}
          unusableMm={settings.outletMm}
          safeFillMm={safeFillMm(table)}
          length={lengthScales[units.length]}
          volume={volumeScales[units.volume]}
          railPx={400}
          keyStepMm={units.length === 'in' ? 25.4 / 8 : 1}
          spoken={spoken}
          grip
        />
        {props.mayKeep && (
          <div className="col-span-2 mt-2">
            <button
              type="button"
              className="act min-h-13 w-full text-lead"
              disabled={answer === null || readings.sending}
              onClick={() => {
                if (answer)
                  void readings.keep({ at: new Date().toISOString(), depthMm: answer.depthMm });
              }}
            >
              {readings.sending ? 'Sending…' : 'Keep this reading'}
            </button>
            <p role="status" className="mt-2 min-h-6">
              {readings.said && (
                <span className={readings.said.ok ? '' : 'fault'}>{readings.said.text}</span>
              )}
            </p>
          </div>
        )}
      </div>
      <div className="grid content-start gap-8">
        <ReadingsBlock readings={readings} units={units} />
        <UnitsChooser person={person} />
      </div>
    </div>
  );
}

/** A dragged line stops at whole marks of the unit. */
const dragDecimals = { mm: 0, cm: 1, in: 0 } as const;

function useIssuedTable(props: TankCardProps): DipTable {
  const { rows, slopeFactor, settings, revision } = props;
  return useMemo(() => {
    const unpacked = unpackRows(rows);
    return {
      curve: curveFromRows(unpacked, slopeFactor),
      plusMinusL: unpacked.map(({ plusMinusL }) => plusMinusL),
      heightMm: revision.heightMm,
      capacityL: revision.capacityL,
      settings,
    };
  }, [rows, slopeFactor, settings, revision]);
}
