import type { ErrorCode, FieldFault } from '~/domain/errors';
import type { Preview } from '~/domain/table/preview';
import type { TankDocument } from '~/domain/tank/document';

/** Page → worker: compute this design. A later request takes the place of one still waiting. */
export interface PreviewRequest {
  number: number;
  design: TankDocument;
}

/** Worker → page: one reply a request that was computed; superseded ones are never answered. */
export type PreviewReply =
  | { number: number; preview: Preview }
  | { number: number; refusal: { code: ErrorCode; message: string; faults: readonly FieldFault[] } };
