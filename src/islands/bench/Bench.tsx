import { useEffect, useMemo, useReducer, useState } from 'react';
import { may } from '~/domain/access/permissions';
import type { Role } from '~/domain/access/roles';
import { safeFillMm } from '~/domain/table/answer-at';
import { levelOfReading } from '~/domain/table/level';
import type { TankDocument } from '~/domain/tank/document';
import { letterAfter } from '~/domain/tank/revision-letter';
import type { Tank } from '~/domain/tank/tank';
import { formatLengthWithUnit } from '~/domain/units/format-length';
import { newScene, sceneReducer } from '~/scene/scene';
import { Query } from '../shared/query';
import { useUnitsPreference } from '../shared/units-preference';
import { FineTable } from '../table/FineTable';
import { Conflict } from './Conflict';
import { Drawing } from './Drawing';
import { IssuePanel } from './IssuePanel';
import { liveTable } from './live-table';
import { noticesOf } from './notices-of';
import { PartsList } from './PartsList';
import { TitleBlock } from './TitleBlock';
import { TopLine } from './TopLine';
import { unseenWords } from './unseen';
import { useCarriedPlusMinus } from './use-carried-plus-minus';
import { useDraftSaving, type Saving } from './use-draft-saving';
import { usePreview } from './use-preview';
import { useSettings } from './use-settings';

export interface BenchProps {
  tank: Tank;
  design: TankDocument;
  etag: string;
  role: Role;
  /** Whose units are remembered. */
  person: string;
}

/** The bench: picture, stick and table on one wet line; parts list and title block below. */
export function Bench(props: BenchProps) {
  return (
    <Query>
      <BenchSheet {...props} />
    </Query>
  );
}

function BenchSheet({ tank, design, etag, role, person }: BenchProps) {
  const [scene, dispatch] = useReducer(sceneReducer, design, newScene);
  const document = scene.history.present;
  const [units] = useUnitsPreference(person);
  const { settings, change, faults, unsaved, saved: settingsSaved } = useSettings(tank);
  useCarriedPlusMinus(document, settings, change);
  const { preview, plusMinus, problem } = usePreview(document, settings);
  const { saving, save, takeTheirs, keepMine } = useDraftSaving(tank.id, document, etag);
  const [depthMm, setDepthMm] = useState<number | null>(null);
  const [issuing, setIssuing] = useState(false);
  const [issued, setIssued] = useState<string | null>(tank.revision?.letter ?? null);
  const [fresh, setFresh] = useState<string | null>(null);
  useUndoKeys(dispatch);

  const table = useMemo(
    () => (preview && plusMinus ? liveTable(preview, plusMinus, settings) : null),
    [preview, plusMinus, settings],
  );
  const depth = table
    ? Math.min(depthMm ?? Math.round(table.heightMm / 2), table.heightMm)
    : (depthMm ?? 0);
  const next = letterAfter(issued);
  const revisionWords = issued ? `draft after ${issued}` : 'draft, nothing issued';
  const stands = standsWords(document);
  const levels = useMemo(() => {
    if (!preview || !table) return { unusable: null, safeFill: null };
    const safe = safeFillMm(table);
    return {
      unusable:
        settings.outletMm === null
          ? null
          : levelOfReading(preview.frame, Math.min(settings.outletMm, table.heightMm)),
      safeFill:
        safe === null || safe >= table.heightMm ? null : levelOfReading(preview.frame, safe),
    };
  }, [preview, table, settings.outletMm]);

  const unseen = table && !problem ? unseenWords(table, units.volume) : null;
  const waitsFor = settingsSaved
    ? waitsForDraft(saving)
    : `The settings are not saved yet${unsaved ? `: ${unsaved}` : '.'}`;
  const startIssue = async () => {
    setFresh(null);
    if (saving.state !== 'saved') await save();
    setIssuing(true);
  };

  return (
    <div className="flex flex-col">
      <TopLine
        history={scene.history}
        dispatch={dispatch}
        saving={saving}
        settingsUnsaved={unsaved}
        revisionWords={revisionWords}
      >
        {issued && (
          <a className="act-plain" href={`/tanks/${tank.id}#paper`}>
            Print
          </a>
        )}
        {may(role, 'revision.issue') && (
          <button
            type="button"
            className="act"
            disabled={saving.state === 'conflict' || problem !== null || preview === null}
            onClick={() => void startIssue()}
          >
            Issue {next}
          </button>
        )}
      </TopLine>
      {saving.state === 'conflict' && (
        <Conflict
          conflict={saving}
          mine={document}
          onTakeTheirs={() => {
            takeTheirs(saving.theirs, saving.theirEtag);
            dispatch({
              type: 'replace',
              name: 'take theirs',
              document: saving.theirs,
            });
          }}
          onKeepMine={() => void keepMine(saving.theirEtag)}
        />
      )}
      {issuing && (
        <IssuePanel
          tankId={tank.id}
          letter={next}
          waitsFor={waitsFor}
          slow={slowWords(document)}
          onClose={() => setIssuing(false)}
          onIssued={(letter) => {
            setIssuing(false);
            setIssued(letter);
            setFresh(letter);
          }}
        />
      )}
      {fresh && (
        <p role="status" className="border-b border-hair bg-sheet px-4 py-3 sm:px-6">
          Revision {fresh} is issued.{' '}
          <a className="act-text font-semibold" href={`/tanks/${tank.id}#paper`}>
            Print its chart
          </a>
        </p>
      )}
      {problem && (
        <p role="alert" className="fault border-b border-hair px-4 py-3 sm:px-6">
          {problem.message}
          {preview && ' The figures below are those of the last shape that could be computed.'}
        </p>
      )}
      {noticesOf(preview, units.length).map((notice) => (
        <p key={notice} role="status" className="fault border-b border-hair px-4 py-2 sm:px-6">
          {notice}
        </p>
      ))}
      {unseen && (
        <p role="status" className="fault border-b border-hair px-4 py-2 sm:px-6">
          {unseen}
        </p>
      )}
      <Drawing
        preview={preview}
        table={table}
        depthMm={depth}
        onDepth={setDepthMm}
        levels={levels}
        selected={scene.selected}
        onSelect={(id) => dispatch({ type: 'select', id })}
        stands={stands}
        length={units.length}
        volume={units.volume}
        name={tank.name}
        person={person}
      />
      <div className="grid border-t border-ink bg-sheet lg:grid-cols-[minmax(0,2fr)_minmax(21rem,1fr)]">
        <div className="min-w-0 px-2 pb-3 sm:px-4 lg:border-r lg:border-ink">
          <PartsList
            document={document}
            selected={scene.selected}
            dispatch={dispatch}
            unit={units.length}
            settings={settings}
            onSettings={change}
            faults={problem?.faults ?? []}
          />
        </div>
        <TitleBlock
          document={document}
          dispatch={dispatch}
          settings={settings}
          onSettings={change}
          settingsFaults={faults}
          shapeFaults={problem?.faults ?? []}
          table={table}
          floorZ={preview?.frame.stick?.zeroZ ?? null}
          length={units.length}
          volume={units.volume}
          revisionWords={revisionWords}
        />
      </div>
      {table && <FineTable table={table} length={units.length} volume={units.volume} />}
      <p className="sr-only" role="status">
        {table &&
          `Brim ${formatBrim(table.capacityL)}. Wet line at ${formatLengthWithUnit(depth, units.length)}.`}
      </p>
    </div>
  );
}

function useUndoKeys(dispatch: (action: { type: 'undo' } | { type: 'redo' }) => void) {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      // a field that is being typed in keeps its own undo
      const field =
        event.target instanceof HTMLInputElement &&
        event.target.value !== event.target.defaultValue;
      if (field) return;
      const key = event.key.toLowerCase();
      const type = key === 'z' ? (event.shiftKey ? 'redo' : 'undo') : key === 'y' ? 'redo' : null;
      if (!type) return;
      event.preventDefault();
      dispatch({ type });
    };
    window.addEventListener('keydown', press);
    return () => window.removeEventListener('keydown', press);
  }, [dispatch]);
}

/** Why a draft could not be issued as it is shown, or null. */
/** Taking the wall off where several solids join costs seconds. */
function slowWords({ wall, solids }: TankDocument): string | null {
  const holds = solids.filter(({ role }) => role === 'holds').length;
  return wall?.sizes === 'outside' && holds > 1
    ? 'Working out the inside of the wall where solids join: this may take some seconds.'
    : null;
}

function waitsForDraft(saving: Saving): string | null {
  switch (saving.state) {
    case 'saved':
      return null;
    case 'changed':
    case 'saving':
      return 'The draft is being saved.';
    case 'unsaved':
      return `The draft is not saved yet: ${saving.why}`;
    case 'conflict':
      return 'Choose first whose draft stands.';
  }
}

function standsWords({ attitude }: TankDocument): string {
  if (!attitude || (attitude.pitch === 0 && attitude.roll === 0)) return 'level';
  return `pitch ${attitude.pitch}°, roll ${attitude.roll}°`;
}

function formatBrim(litres: number): string {
  return `${litres.toFixed(1)} litres`;
}
