import { fork, type ChildProcess } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { StrapOutcome } from '~/commands/strap/run-strap';

interface Answer {
  outcome: StrapOutcome;
  processorMs: number;
}

/** The command in a process that is ended, and started anew, when it takes too long. */
export interface StrapProcess {
  /** null when it took more of a processor than the limit; waiting for a busy one is not counted. */
  run(args: readonly string[]): Promise<Answer | null>;
  stop(): void;
}

export async function startStrapProcess(limitMs: number): Promise<StrapProcess> {
  let child = await started();
  return {
    async run(args) {
      const before = processorMs(child);
      const answer = await answered(child, args, () => processorMs(child) - before > limitMs);
      if (answer === null) {
        child.kill('SIGKILL');
        child = await started();
      }
      return answer;
    },
    stop: () => void child.kill('SIGKILL'),
  };
}

async function answered(
  child: ChildProcess,
  args: readonly string[],
  isLate: () => boolean,
): Promise<Answer | null> {
  let watch: NodeJS.Timeout | undefined;
  try {
    return await new Promise((resolve, reject) => {
      watch = setInterval(() => {
        if (isLate()) resolve(null);
      }, 100);
      child.once('message', (message) => resolve(message as Answer));
      child.once('exit', (code) => reject(new Error(`the command ended by itself with ${code}`)));
      child.send([...args]);
    });
  } finally {
    clearInterval(watch);
    child.removeAllListeners();
  }
}

async function started(): Promise<ChildProcess> {
  const file = fileURLToPath(new URL('./strap-answers.mjs', import.meta.url));
  const child = fork(file, {
    execArgv: ['--import', 'tsx'],
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  await new Promise((resolve, reject) => {
    child.once('message', resolve);
    child.once('exit', (code) => reject(new Error(`the command did not start: ${code}`)));
  });
  child.removeAllListeners();
  return child;
}

/** User and system time of a process so far, ms; clock ticks of 10 ms. */
function processorMs({ pid }: ChildProcess): number {
  const fields = readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ')[1]!.split(' ');
  return (Number(fields[11]) + Number(fields[12])) * 10;
}
