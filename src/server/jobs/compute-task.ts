import type { ErrorCode, FieldFault } from '~/domain/errors';
import type { IssuedTable } from '~/domain/table/issued-table';
import type { Sketch } from '~/domain/report/sketch';
import type { ComputedTable, Readings } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import type { AcceptedMesh, MeshFile } from './mesh-work';

/** Pool → worker: one piece of work. */
export type ComputeTask =
  | ({ design: TankDocument; meshes: readonly MeshFile[] } & (
      | { work: 'table'; readings: Readings }
      | { work: 'issue'; settings: TankSettings; stepMm: number }
      | { work: 'sketch' }
    ))
  | { work: 'mesh'; file: string };

/** Worker → pool. A refusal travels as data, since an error loses its fields between threads. */
export type ComputeOutcome =
  | { result: ComputedTable | IssuedTable | Sketch | AcceptedMesh }
  | { refusal: { code: ErrorCode; message: string; faults: readonly FieldFault[] } };
