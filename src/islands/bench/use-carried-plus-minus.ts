import { useEffect, useRef } from 'react';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import type { TankChange } from '~/domain/tank/tank';
import { renamedPlusMinus } from './renamed-plus-minus';

/** Carries the ± of single sizes along when a solid is given another name, also by Undo and Redo. */
export function useCarriedPlusMinus(
  document: TankDocument,
  settings: TankSettings,
  onSettings: (change: TankChange) => void,
): void {
  const last = useRef(document);
  const { ownSizePlusMinusMm: own } = settings;
  useEffect(() => {
    const before = last.current;
    last.current = document;
    const carried = own && renamedPlusMinus(before, document, own);
    if (carried) onSettings({ ownSizePlusMinusMm: carried });
  }, [document, own, onSettings]);
}
