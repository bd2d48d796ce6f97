import { useMutation } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';
import type { FieldFault } from '~/domain/errors';
import type { TankSettings } from '~/domain/tank/settings';
import type { Tank, TankChange } from '~/domain/tank/tank';
import { changeTank } from '../shared/api';
import { asProblem } from '../shared/problem';
import { askBeforeLeaving } from './ask-before-leaving';
import { mayPassLater, retryMs } from './may-pass-later';

type SettingsSaving =
  | { state: 'saved' }
  | { state: 'saving' }
  /** `again`: nobody refused it, so that it is sent again by itself. */
  | { state: 'unsaved'; why: string; again: boolean; faults: readonly FieldFault[] };

/**
 * The tank's settings, changed in place: shown at once, sent one after the other. What the server
 * has not acknowledged stays owed and goes along with the next try.
 */
export function useSettings(tank: Tank) {
  const [settings, setSettings] = useState<TankSettings>(tank.settings);
  const [saving, setSaving] = useState<SettingsSaving>({ state: 'saved' });
  const { mutateAsync } = useMutation({
    mutationFn: (change: TankChange) => changeTank(tank.id, change),
  });
  const owed = useRef<TankChange>({});
  const busy = useRef(false);

  const send = useCallback(async () => {
    if (busy.current) return;
    busy.current = true;
    setSaving({ state: 'saving' });
    let sent: TankChange = {};
    try {
      while (Object.keys(owed.current).length > 0) {
        sent = owed.current;
        owed.current = {};
        await mutateAsync(sent);
      }
      setSaving({ state: 'saved' });
    } catch (error) {
      owed.current = { ...sent, ...owed.current };
      const problem = asProblem(error);
      setSaving({
        state: 'unsaved',
        why: problem.message,
        again: mayPassLater(problem),
        faults: problem.faults,
      });
    } finally {
      busy.current = false;
    }
  }, [mutateAsync]);

  useEffect(() => {
    if (saving.state !== 'unsaved' || !saving.again) return;
    const timer = setTimeout(() => void send(), retryMs);
    return () => clearTimeout(timer);
  }, [saving, send]);
  useEffect(() => (saving.state === 'saved' ? undefined : askBeforeLeaving()), [saving.state]);

  const change = useCallback(
    (part: TankChange) => {
      const { name: _name, ...own } = part;
      setSettings((now) => ({ ...now, ...own }));
      owed.current = { ...owed.current, ...part };
      void send();
    },
    [send],
  );
  const failed = saving.state === 'unsaved' ? saving : null;
  return {
    settings,
    change,
    faults: failed?.faults ?? [],
    unsaved: failed?.why ?? null,
    saved: saving.state === 'saved',
  };
}
