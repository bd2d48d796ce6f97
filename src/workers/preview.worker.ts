import { DipwrightError } from '~/domain/errors';
import { computePreview } from '~/domain/table/compute-preview';
import type { Preview } from '~/domain/table/preview';
import { plusMinusOfTable } from '~/domain/table/uncertainty';
import { provideMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { loadManifold } from '~/geometry/manifold';
import { latestWins } from './latest-wins';
import type { PreviewReply, PreviewRequest } from './preview-protocol';

/** The browser's worker: previews of designs as they change, the newest request first and only. */
const scope = self as unknown as {
  onmessage: ((event: MessageEvent<PreviewRequest>) => void) | null;
  postMessage(message: PreviewReply, transfer?: Transferable[]): void;
};

const ready = loadManifold();

const take = latestWins<PreviewRequest>(async (request) => {
  const { number, design } = request;
  try {
    await ready;
    if (request.ask === 'plus-minus') {
      const plusMinus = await plusMinusOfTable(design, request.measured, request.table);
      scope.postMessage({ number, plusMinus });
      return;
    }
    const start = performance.now();
    const preview = await computePreview(design);
    const tookMs = performance.now() - start;
    scope.postMessage({ number, preview, tookMs }, buffersOf(preview));
  } catch (error) {
    scope.postMessage({ number, refusal: refusalOf(error) });
  }
});
scope.onmessage = ({ data }) => {
  for (const { upload, mesh } of data.meshes ?? []) provideMesh(upload, mesh);
  take(data);
};

function buffersOf({ space, solids }: Preview): Transferable[] {
  return [space, ...solids].flatMap(({ positions, triangles }) => [
    positions.buffer,
    triangles.buffer,
  ]);
}

function refusalOf(error: unknown) {
  if (error instanceof DipwrightError) {
    const { code, message, faults } = error;
    return { code, message, faults };
  }
  console.error(error);
  const message = 'The tank cannot be computed here. Reload the page to try again.';
  return { code: 'unavailable' as const, message, faults: [] };
}
