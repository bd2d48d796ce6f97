import { fileURLToPath } from 'node:url';
import { Piscina } from 'piscina';
import { DipwrightError } from '~/domain/errors';
import type { IssuedTable } from '~/domain/table/issued-table';
import type { Sketch } from '~/domain/report/sketch';
import type { ComputedTable, Readings } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';
import type { ComputeOutcome, ComputeTask } from './compute-task';
import type { AcceptedMesh, MeshFile } from './mesh-work';

/**
 * Geometry off the event loop. Every call rejects with a DipwrightError: `invalid` with pointers into the
 * design for a bad one, `unavailable` when it takes too long, too many wait, or the pool has closed.
 */
export interface ComputePool {
  table(
    design: TankDocument,
    readings: Readings,
    meshes?: readonly MeshFile[],
  ): Promise<ComputedTable>;
  /** Refuses (`invalid`, one fault a reason) what may not be issued: empty, in pieces, thinner than 0.01 mm. */
  issue(
    design: TankDocument,
    settings: TankSettings,
    stepMm: number,
    meshes?: readonly MeshFile[],
  ): Promise<IssuedTable>;
  /** The sketch of a print: hidden edges are found here, not on the event loop. */
  sketch(design: TankDocument, meshes?: readonly MeshFile[]): Promise<Sketch>;
  /** Reads and checks a file that was sent; `invalid`, one fault a sentence, for what is no closed mesh. */
  mesh(file: string): Promise<AcceptedMesh>;
  /** Waits for running work, then ends the threads. */
  close(): Promise<void>;
}

export interface ComputePoolOptions {
  threads: number;
  /** The bundled worker; left out where the sources run as they are (tests, development). */
  workerFile?: string | undefined;
  /** Longest a task may take, waiting included, seconds. */
  limitSeconds?: { table?: number; issue?: number };
  /** Told of what goes wrong outside any task, such as a thread that died. */
  onError?: (error: unknown) => void;
}

/** Most tasks that may wait for a thread. */
const mostWaiting = 200;

export function createComputePool(options: ComputePoolOptions): ComputePool {
  const { threads, workerFile, limitSeconds = {}, onError = () => {} } = options;
  const filename =
    workerFile ?? fileURLToPath(new URL('./compute-worker-from-source.mjs', import.meta.url));
  const pool = new Piscina({
    filename,
    minThreads: 1,
    maxThreads: threads,
    idleTimeout: 60_000,
    maxQueue: mostWaiting,
    execArgv: [],
  });
  pool.on('error', onError);
  let closed = false;

  async function run(
    task: ComputeTask,
    seconds: number,
  ): Promise<ComputedTable | IssuedTable | Sketch | AcceptedMesh> {
    if (closed) throw unavailable('The server is stopping. Try again in a moment.');
    const product = task.work === 'sketch' || task.work === 'mesh' ? task.work : 'table';
    const signal = AbortSignal.timeout(seconds * 1000);
    let outcome: ComputeOutcome;
    try {
      outcome = (await pool.run(task, { signal })) as ComputeOutcome;
    } catch (error) {
      if (signal.aborted) {
        throw unavailable(
          `The ${product} was not ready after ${seconds} seconds. Try again, or take a simpler shape${product === 'table' ? ' or a larger step' : ''}.`,
          error,
        );
      }
      if (pool.queueSize >= mostWaiting) {
        throw unavailable('Too many tables are being computed. Try again in a minute.', error);
      }
      if (closed) throw unavailable('The server is stopping. Try again in a moment.', error);
      onError(error);
      throw unavailable(
        `The ${product} could not be computed. Try again; if it happens again, change the shape a little.`,
        error,
      );
    }
    if ('refusal' in outcome) {
      const { code, message, faults } = outcome.refusal;
      throw new DipwrightError(code, message, { faults });
    }
    return outcome.result;
  }

  return {
    table: (design, readings, meshes = []) =>
      run(
        { work: 'table', design, readings, meshes },
        limitSeconds.table ?? 30,
      ) as Promise<ComputedTable>,
    issue: (design, settings, stepMm, meshes = []) =>
      run(
        { work: 'issue', design, settings, stepMm, meshes },
        limitSeconds.issue ?? 90,
      ) as Promise<IssuedTable>,
    sketch: (design, meshes = []) =>
      run({ work: 'sketch', design, meshes }, limitSeconds.table ?? 30) as Promise<Sketch>,
    mesh: (file) => run({ work: 'mesh', file }, limitSeconds.table ?? 30) as Promise<AcceptedMesh>,
    async close() {
      closed = true;
      await pool.close();
    },
  };
}

function unavailable(message: string, cause?: unknown): DipwrightError {
  return new DipwrightError('unavailable', message, { cause });
}
