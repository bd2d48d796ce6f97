import { DipwrightError } from '~/domain/errors';
import type { Log } from '../log';
import { internalProblem, problem } from './problem';

/** The one place where whatever was thrown becomes an answer. */
export function answerError(error: unknown, log: Log, requestId: string): Response {
  if (error instanceof DipwrightError) {
    const etag = error.facts['etag'];
    return problem(error, requestId, typeof etag === 'string' ? { etag } : {});
  }
  if (isLostDatabase(error)) {
    log.error('the database does not answer', { requestId, error });
    return problem(
      new DipwrightError(
        'unavailable',
        'The database does not answer just now. Nothing was kept: try again in a few seconds.',
      ),
      requestId,
    );
  }
  log.error('a request failed', { requestId, error });
  return internalProblem(requestId);
}

/** No connection, or one that broke; known by name, since this room does not know the driver. */
function isLostDatabase(error: unknown): boolean {
  const fault = error as { name?: string; parent?: { fatal?: boolean; errno?: number } } | null;
  const retriedInVain = [1205, 1213];
  return (
    /^SequelizeConnection|^SequelizeHost|^SequelizeAccessDenied/.test(fault?.name ?? '') ||
    fault?.parent?.fatal === true ||
    retriedInVain.includes(fault?.parent?.errno ?? 0)
  );
}
