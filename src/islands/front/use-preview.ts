import { useEffect, useRef, useState } from 'react';
import type { Preview } from '~/domain/table/preview';
import type { TankDocument } from '~/domain/tank/document';
import { createPreviewClient, type PreviewClient } from '~/workers/preview-client';
import { asProblem } from '../shared/problem';

/** The latest computed preview of a design; the last good one stands while the next is computed. */
export function usePreview(design: TankDocument): {
  preview: Preview | null;
  fault: string | null;
} {
  const client = useRef<PreviewClient | null>(null);
  const [preview, setPreview] = useState<Preview | null>(null);
  const [fault, setFault] = useState<string | null>(null);

  useEffect(() => {
    const started = createPreviewClient();
    client.current = started;
    return () => started.close();
  }, []);

  useEffect(() => {
    let wanted = true;
    client.current!.compute(design).then(
      (computed) => {
        if (!wanted || computed === null) return;
        setPreview(computed);
        setFault(null);
      },
      (error: unknown) => {
        if (wanted) setFault(asProblem(error).message);
      },
    );
    return () => {
      wanted = false;
    };
  }, [design]);

  return { preview, fault };
}
