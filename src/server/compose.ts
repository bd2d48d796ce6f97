import { createSessions } from './auth/sessions';
import type { Config } from './config';
import type { Context } from './context';
import { connect } from './database/connect';
import { createComputePool } from './jobs/compute-pool';
import { createLog } from './log';
import { localFiles } from './storage/local-files';
import { keepTidy } from './services/keep-tidy';

/** Builds the context, once for a process. Nothing is asked of the database before the first request. */
export async function composeContext(config: Config): Promise<Context> {
  const log = createLog(config.log.level);
  const database = connect(config.database, { poolSize: config.database.poolSize });
  const sessions = createSessions(database, { tls: config.http.tls });
  const computePool = createComputePool({
    threads: config.compute.workers,
    workerFile: config.compute.workerFile,
    onError: (error) => log.error('the compute pool failed', { error }),
  });
  const clock = { now: () => new Date() };
  const stopTidying = keepTidy({ database, sessions, clock, log });
  return {
    config,
    log,
    database,
    sessions,
    computePool,
    storage: localFiles(config.storage.folder),
    clock,
    async close() {
      stopTidying();
      await computePool.close();
      await database.close();
    },
  };
}
