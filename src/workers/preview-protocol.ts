import type { ErrorCode, FieldFault } from '~/domain/errors';
import type { Preview } from '~/domain/table/preview';
import type { Measured, PlusMinus, TableWithoutPlusMinus } from '~/domain/table/uncertainty';
import type { TankDocument } from '~/domain/tank/document';
import type { Mesh } from '~/geometry/mesh';

/** A mesh that the worker may not have yet, under the name that solids give it. */
export interface NamedMesh {
  upload: string;
  mesh: Mesh;
}

/** Page → worker: compute this design, or the ± of its rows. A later request takes the place of one still waiting, but the
 * meshes of every request are kept. */
export type PreviewRequest = {
  number: number;
  design: TankDocument;
  meshes?: readonly NamedMesh[];
} & ({ ask: 'preview' } | { ask: 'plus-minus'; table: TableWithoutPlusMinus; measured: Measured });

/** Worker → page: one reply a request that was computed; superseded ones are never answered. */
export type PreviewReply = { number: number } & (
  | { preview: Preview; tookMs: number }
  | { plusMinus: PlusMinus }
  | { refusal: { code: ErrorCode; message: string; faults: readonly FieldFault[] } }
);
