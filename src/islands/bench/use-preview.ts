import { useEffect, useRef, useState } from "react";
import { DipwrightError } from "~/domain/errors";
import type { Preview } from "~/domain/table/preview";
import type { TankDocument } from "~/domain/tank/document";
import {
  createPreviewClient,
  type PreviewClient,
} from "~/workers/preview-client";

export interface LivePreview {
  /** The last shape that could be computed; it stays while the present one cannot. */
  preview: Preview | null;
  /** Why the present design cannot be computed. */
  problem: DipwrightError | null;
}

/** Computes the design in a worker as it changes; the newest wins. */
export function usePreview(design: TankDocument): LivePreview {
  const client = useRef<PreviewClient | null>(null);
  const [live, setLive] = useState<LivePreview>({
    preview: null,
    problem: null,
  });

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
    client.current?.compute(design).then(
      (preview) => {
        if (current && preview) setLive({ preview, problem: null });
      },
      (error: unknown) => {
        if (!current) return;
        const problem =
          error instanceof DipwrightError
            ? error
            : new DipwrightError(
                "unavailable",
                "The tank cannot be computed here.",
                {
                  cause: error,
                },
              );
        setLive((last) => ({ preview: last.preview, problem }));
      },
    );
    return () => {
      current = false;
    };
  }, [design]);

  return live;
}
