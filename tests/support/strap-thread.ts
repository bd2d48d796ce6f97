import { Worker } from 'node:worker_threads';
import type { StrapOutcome } from '~/commands/strap/run-strap';

/** The command in a thread that is ended, and started anew, when it takes too long. */
export interface StrapThread {
  /** `outcome` null when it took more than the limit. Processor time of the whole process, ms. */
  run(args: readonly string[]): Promise<{ outcome: StrapOutcome | null; processorMs: number }>;
  stop(): Promise<void>;
}

/** A thread whose answers may take `limitMs` of a processor each; waiting for a busy one is not counted. */
export async function startStrapThread(limitMs: number): Promise<StrapThread> {
  let worker = await started();
  return {
    async run(args) {
      const startMs = processorMs();
      const outcome = await answered(worker, args, () => processorMs() - startMs > limitMs);
      const tookMs = processorMs() - startMs;
      if (outcome === null) {
        await worker.terminate();
        worker = await started();
      }
      return { outcome, processorMs: tookMs };
    },
    async stop() {
      await worker.terminate();
    },
  };
}

async function answered(
  worker: Worker,
  args: readonly string[],
  isLate: () => boolean,
): Promise<StrapOutcome | null> {
  let watch: NodeJS.Timeout | undefined;
  try {
    return await new Promise((resolve, reject) => {
      watch = setInterval(() => {
        if (isLate()) resolve(null);
      }, 50);
      worker.once('message', resolve);
      worker.once('error', reject);
      worker.postMessage(args);
    });
  } finally {
    clearInterval(watch);
    worker.removeAllListeners();
  }
}

async function started(): Promise<Worker> {
  const worker = new Worker(new URL('./strap-worker.mjs', import.meta.url));
  await new Promise((resolve, reject) => {
    worker.once('message', resolve);
    worker.once('error', reject);
  });
  worker.removeAllListeners();
  return worker;
}

function processorMs(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}
