import { execFile } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { ComputedTable } from '~/domain/table/request';

/** What a child process printed and how it ended. */
export interface ChildOutcome {
  exit: number;
  out: string;
  err: string;
}

/** Runs a program in the checkout. */
export function child(program: string, ...args: string[]): Promise<ChildOutcome> {
  return new Promise((resolve) => {
    execFile(program, args, (error, out, err) => {
      resolve({ exit: error ? Number(error.code) : 0, out, err });
    });
  });
}

/** The table of a design at some readings, by the command as README has it; throws what it says on stderr. */
export async function tableByCommand(
  design: unknown,
  atMm: readonly number[],
): Promise<ComputedTable> {
  const folder = mkdtempSync(join(tmpdir(), 'strap-'));
  try {
    const file = join(folder, 'design.json');
    writeFileSync(file, JSON.stringify(design));
    const { exit, out, err } = await child(
      'npm',
      ...['run', '--silent', 'strap', '--', file, '--at', atMm.join(',')],
    );
    if (exit !== 0 || err !== '') throw new Error(`exit ${exit}: ${err}`);
    return JSON.parse(out) as ComputedTable;
  } finally {
    rmSync(folder, { recursive: true });
  }
}
