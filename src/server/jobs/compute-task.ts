import type { ErrorCode, FieldFault } from '~/domain/errors';
import type { IssuedTable } from '~/domain/table/issued-table';
import type { Sketch } from '~/domain/report/sketch';
import type { ComputedTable, Readings } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';

/** Pool → worker: one piece of work. */
export type ComputeTask =
  | { work: 'table'; design: TankDocument; readings: Readings }
  | { work: 'issue'; design: TankDocument; settings: TankSettings; stepMm: number }
  | { work: 'sketch'; design: TankDocument };

/** Worker → pool. A refusal travels as data, since an error loses its fields between threads. */
export type ComputeOutcome =
  | { result: ComputedTable | IssuedTable | Sketch }
  | { refusal: { code: ErrorCode; message: string; faults: readonly FieldFault[] } };
