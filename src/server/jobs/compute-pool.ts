import type { IssuedTable } from '~/domain/table/issued-table';
import type { ComputedTable, Readings } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';

/**
 * Geometry off the event loop. Every call rejects with a DipwrightError: `invalid` with pointers into
 * the design for a bad one, `unavailable` when it takes too long or the pool is closing.
 */
export interface ComputePool {
  table(design: TankDocument, readings: Readings): Promise<ComputedTable>;
  /** Refuses (`invalid`, one fault a reason) what may not be issued: empty, in pieces, thinner than 0.01 mm. */
  issue(design: TankDocument, settings: TankSettings, stepMm: number): Promise<IssuedTable>;
  /** Waits for running work, then ends the threads. */
  close(): Promise<void>;
}
