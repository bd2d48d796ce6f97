import { useEffect, useRef, useState } from 'react';
import { DipwrightError } from '~/domain/errors';
import type { Preview } from '~/domain/table/preview';
import type { PlusMinus } from '~/domain/table/uncertainty';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import { fetchMeshes } from './fetch-meshes';
import { createPreviewClient, type PreviewClient } from '~/workers/preview-client';

export interface LivePreview {
  /** The last shape that could be computed; it stays while the present one cannot. */
  preview: Preview | null;
  /** ± of its rows and of its brim. For the moment after an edit it is still that of the shape before. */
  plusMinus: PlusMinus | null;
  /** Why the present design cannot be computed. */
  problem: DipwrightError | null;
}

const restMs = 120;

/** Computes the design in a worker as it changes, then the ± of its rows; the newest wins. */
export function usePreview(
  design: TankDocument,
  { sizePlusMinusMm, ownSizePlusMinusMm, dipPlusMinusMm }: TankSettings,
): LivePreview {
  const client = useRef<PreviewClient | null>(null);
  const [live, setLive] = useState<LivePreview>({ preview: null, plusMinus: null, problem: null });

  useEffect(() => {
    const started = createPreviewClient();
    client.current = started;
    return () => {
      client.current = null;
      started.close();
    };
  }, []);

  useEffect(() => {
    let current = true;
    const follow = async (worker: PreviewClient) => {
      const meshes = await fetchMeshes(design);
      if (!current) return;
      const preview = await worker.compute(design, meshes);
      if (!current || !preview) return;
      setLive(({ plusMinus }) => ({ preview, plusMinus, problem: null }));
      // one run a size: left until the hand rests, so that the next edit never waits for it
      await new Promise((resolve) => setTimeout(resolve, restMs));
      if (!current) return;
      const plusMinus = await worker.plusMinus(design, preview, {
        sizePlusMinusMm,
        dipPlusMinusMm,
        ...(ownSizePlusMinusMm === undefined ? {} : { ownSizePlusMinusMm }),
      });
      if (current && plusMinus) setLive({ preview, plusMinus, problem: null });
    };
    if (client.current) {
      follow(client.current).catch((error: unknown) => {
        if (!current) return;
        const problem =
          error instanceof DipwrightError
            ? error
            : new DipwrightError('unavailable', 'The tank cannot be computed here.', {
                cause: error,
              });
        setLive((last) => ({ ...last, problem }));
      });
    }
    return () => {
      current = false;
    };
  }, [design, sizePlusMinusMm, ownSizePlusMinusMm, dipPlusMinusMm]);

  return live;
}
