import { DipwrightError } from '~/domain/errors';
import type { Preview } from '~/domain/table/preview';
import type { NamedMesh } from './preview-protocol';
import type { Measured, PlusMinus } from '~/domain/table/uncertainty';
import type { TankDocument } from '~/domain/tank/document';
import type { PreviewReply, PreviewRequest } from './preview-protocol';

/** Computes previews off the page's own thread. Latest wins. */
export interface PreviewClient {
  /**
   * The preview of a design; null when a later call took its place. Rejects with a DipwrightError
   * (`invalid`, JSON pointers into the design) when the design cannot be computed, and with
   * `unavailable` when the worker cannot run. `meshes`: those that the worker was not given yet.
   */
  compute(design: TankDocument, meshes?: readonly NamedMesh[]): Promise<Preview | null>;
  /**
   * The ± of each row of a preview of that design and of its brim, litres (JCGM 100, first order: sizes,
   * dip, computing); null when a later call took its place. Slower than a preview: one run a size.
   */
  plusMinus(design: TankDocument, preview: Preview, measured: Measured): Promise<PlusMinus | null>;
  /** Ends the worker; open calls resolve to null. */
  close(): void;
}

interface Call {
  number: number;
  resolve(reply: PreviewReply | null): void;
  reject(error: Error): void;
}

type Asked = PreviewRequest extends infer R
  ? R extends unknown
    ? Omit<R, 'number'>
    : never
  : never;

/** What the client needs of a worker, so that a test can stand in for the browser's. */
export interface PreviewWorker {
  postMessage(message: PreviewRequest): void;
  terminate(): void;
  onmessage: ((event: MessageEvent<PreviewReply>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
}

/** Only in the browser: starts the worker at once, so that its WebAssembly is warm at the first edit. */
export function createPreviewClient(
  startWorker: () => PreviewWorker = startPreviewWorker,
): PreviewClient {
  const worker = startWorker();
  let latest = 0;
  let open: Call | null = null;

  worker.onmessage = ({ data }) => {
    if (!open || data.number !== open.number) return;
    const call = open;
    open = null;
    if (!('refusal' in data)) call.resolve(data);
    else {
      const { code, message, faults } = data.refusal;
      call.reject(new DipwrightError(code, message, { faults }));
    }
  };
  worker.onerror = () => {
    const call = open;
    open = null;
    call?.reject(
      new DipwrightError(
        'unavailable',
        'The tank cannot be computed here. Reload the page to try again.',
      ),
    );
  };

  function ask(request: Asked): Promise<PreviewReply | null> {
    open?.resolve(null);
    latest += 1;
    const number = latest;
    return new Promise((resolve, reject) => {
      open = { number, resolve, reject };
      worker.postMessage({ ...request, number });
    });
  }

  return {
    async compute(design, meshes = []) {
      const reply = await ask({
        ask: 'preview',
        design,
        ...(meshes.length === 0 ? {} : { meshes }),
      });
      return reply && 'preview' in reply ? reply.preview : null;
    },
    async plusMinus(design, { rows, frame: { heightMm }, errorL }, measured) {
      const table = { rows: [...rows], heightMm, errorL };
      const reply = await ask({ ask: 'plus-minus', design, table, measured });
      return reply && 'plusMinus' in reply ? reply.plusMinus : null;
    },
    close() {
      worker.terminate();
      open?.resolve(null);
      open = null;
    },
  };
}

function startPreviewWorker(): PreviewWorker {
  return new Worker(new URL('./preview.worker.ts', import.meta.url), { type: 'module' });
}
