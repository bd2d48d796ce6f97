import { useMutation } from '@tanstack/react-query';
import { useCallback, useState } from 'react';
import type { FieldFault } from '~/domain/errors';
import type { TankSettings } from '~/domain/tank/settings';
import type { Tank, TankChange } from '~/domain/tank/tank';
import { changeTank } from '../shared/api';
import { asProblem } from '../shared/problem';

/** The tank's settings, changed in place: shown at once, saved one after the other. */
export function useSettings(tank: Tank) {
  const [settings, setSettings] = useState<TankSettings>(tank.settings);
  const [faults, setFaults] = useState<readonly FieldFault[]>([]);
  const [unsaved, setUnsaved] = useState<string | null>(null);
  const { mutate, isPending } = useMutation({
    mutationFn: (change: TankChange) => changeTank(tank.id, change),
    scope: { id: `settings of ${tank.id}` },
    onSuccess: () => {
      setFaults([]);
      setUnsaved(null);
    },
    onError: (error) => {
      const problem = asProblem(error);
      setFaults(problem.faults);
      setUnsaved(problem.message);
    },
  });
  const change = useCallback(
    (part: TankChange) => {
      const { name: _name, ...own } = part;
      setSettings((now) => ({ ...now, ...own }));
      mutate(part);
    },
    [mutate],
  );
  return { settings, change, faults, unsaved, saving: isPending };
}
