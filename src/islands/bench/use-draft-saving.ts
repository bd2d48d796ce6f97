import { useMutation } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';
import { tankDocument, type TankDocument } from '~/domain/tank/document';
import { saveDesign } from '../shared/api';
import { asProblem } from '../shared/problem';
import { askBeforeLeaving } from './ask-before-leaving';
import { mayPassLater, retryMs } from './may-pass-later';

/** What stands of the draft on the server, as said in the top line. */
export type Saving =
  | { state: 'saved'; at: Date | null }
  | { state: 'changed' }
  | { state: 'saving' }
  /** `again`: nobody refused it, so that the same draft is sent again by itself. */
  | { state: 'unsaved'; why: string; again: boolean }
  | {
      state: 'conflict';
      theirs: TankDocument;
      theirEtag: string;
      by: string;
      at: string;
    };

const restMs = 700;

/**
 * Saves the draft by itself after a moment of rest, with the version it was read at. Somebody
 * else's save in between is told, never written over.
 */
export function useDraftSaving(tankId: string, design: TankDocument, firstEtag: string) {
  const etag = useRef(firstEtag);
  const savedDesign = useRef(design);
  const savedAt = useRef<Date | null>(null);
  const triedDesign = useRef(design);
  const [saving, setSaving] = useState<Saving>({ state: 'saved', at: null });
  const { mutateAsync } = useMutation({
    mutationFn: (send: { design: TankDocument; etag: string }) =>
      saveDesign(tankId, send.design, send.etag),
  });
  const busy = useRef(false);
  const latest = useRef(design);
  latest.current = design;

  const save = useCallback(
    async (withEtag: string = etag.current) => {
      if (busy.current) return;
      busy.current = true;
      const sent = latest.current;
      triedDesign.current = sent;
      setSaving({ state: 'saving' });
      try {
        const answer = await mutateAsync({ design: sent, etag: withEtag });
        etag.current = answer.etag ?? withEtag;
        savedDesign.current = sent;
        savedAt.current = new Date();
        setSaving(
          latest.current === sent ? { state: 'saved', at: savedAt.current } : { state: 'changed' },
        );
      } catch (error) {
        const problem = asProblem(error);
        const theirs = tankDocument.safeParse(problem.facts.design);
        if (problem.code === 'precondition-failed' && theirs.success) {
          setSaving({
            state: 'conflict',
            theirs: theirs.data,
            theirEtag: String(problem.facts.etag),
            by: String(problem.facts.savedBy),
            at: String(problem.facts.savedAt),
          });
        } else {
          setSaving({ state: 'unsaved', why: problem.message, again: mayPassLater(problem) });
        }
      } finally {
        busy.current = false;
      }
    },
    [mutateAsync],
  );

  useEffect(() => {
    if (saving.state === 'conflict' || saving.state === 'saving') return;
    const refused = saving.state === 'unsaved' && !saving.again;
    if (design === savedDesign.current && (refused || saving.state !== 'unsaved')) {
      // undone to what the server has
      if (saving.state !== 'saved') setSaving({ state: 'saved', at: savedAt.current });
      return;
    }
    const same = design === triedDesign.current;
    if (refused && same) return;
    if (refused || saving.state === 'saved') setSaving({ state: 'changed' });
    const wait = saving.state === 'unsaved' && same ? retryMs : restMs;
    const timer = setTimeout(() => void save(), wait);
    return () => clearTimeout(timer);
  }, [design, saving, save]);
  useEffect(() => (saving.state === 'saved' ? undefined : askBeforeLeaving()), [saving.state]);

  /** Ends a conflict with the other's document, which the bench then shows. */
  const takeTheirs = useCallback((theirs: TankDocument, theirEtag: string) => {
    etag.current = theirEtag;
    savedDesign.current = theirs;
    savedAt.current = new Date();
    setSaving({ state: 'saved', at: savedAt.current });
  }, []);

  /** Ends a conflict with what stands here, saved over the other's version knowingly. */
  const keepMine = useCallback((theirEtag: string) => save(theirEtag), [save]);

  return { saving, save, takeTheirs, keepMine };
}
