import type { Sessions } from './auth/sessions';
import type { Config } from './config';
import type { Database } from './database/connect';
import type { ComputePool } from './jobs/compute-pool';
import type { Log } from './log';
import type { FileStore } from './storage/file-store';

export type { Actor } from '~/domain/access/actor';

/** What every use case works with: built once by compose.ts and handed down. */
export interface Context {
  config: Config;
  log: Log;
  database: Database;
  sessions: Sessions;
  computePool: ComputePool;
  storage: FileStore;
  clock: Clock;
  /** Ends the worker pool and the connections. */
  close(): Promise<void>;
}

export interface Clock {
  now(): Date;
}
