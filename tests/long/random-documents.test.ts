import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import fc from 'fast-check';
import { afterAll, expect, it } from 'vitest';
import type { StrapOutcome } from '~/commands/strap/run-strap';
import { brokenDesign } from '../support/broken-designs';
import { plainTank } from '../support/plain-tanks';
import { startStrapProcess } from '../support/strap-process';

/** Half of them sound, half broken; DOCUMENTS=100 for a quick look. */
const each = Number(process.env.DOCUMENTS ?? 2000) / 2;
/** Processor time, so that a busy machine fails nothing. */
const limitMs = 5000;
const folder = mkdtempSync(join(tmpdir(), 'dipwright-documents-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const counts = { tables: 0, refused: 0, refusedPastTheSchema: 0, slowestMs: 0 };

/**
 * Two thousand random documents through what the command runs, half of them broken: a table or one sentence,
 * never a crash, never NaN, never more than five seconds of a processor.
 */
it(
  'two thousand random documents give a table or one sentence',
  { timeout: 3_600_000 },
  async () => {
    const documents = [
      ...fc
        .sample(plainTank(), { numRuns: each, seed: 101 })
        .map((tank) => ({ text: JSON.stringify(tank), isBroken: false })),
      ...fc
        .sample(brokenDesign, { numRuns: each, seed: 202 })
        .map((text) => ({ text, isBroken: true })),
    ];
    const file = join(folder, 'design.json');
    const command = await startStrapProcess(limitMs);
    const complaints: string[] = [];
    for (const [index, { text, isBroken }] of documents.entries()) {
      writeFileSync(file, text);
      const answer = await command.run([file, '--step', '25']);
      counts.slowestMs = Math.max(counts.slowestMs, Math.round(answer?.processorMs ?? limitMs));
      const complaint = answer
        ? complaintOf(answer.outcome, isBroken)
        : `no answer within ${limitMs} ms of a processor`;
      if (complaint) complaints.push(`${index}: ${complaint}\n${text.slice(0, 1500)}`);
    }
    command.stop();
    console.log(counts);
    expect(complaints).toEqual([]);
    // of the broken half enough was caught by the schema, enough by what comes after it, and enough was a tank
    expect(counts.tables).toBeGreaterThan(1.1 * each);
    expect(counts.refused).toBeGreaterThan(each / 2);
    expect(counts.refusedPastTheSchema).toBeGreaterThan(each / 8);
  },
);

/** What is wrong with an outcome; null when nothing is. */
function complaintOf(outcome: StrapOutcome, isBroken: boolean): string | null {
  return outcome.exitCode === 0 ? ofTable(outcome.stdout) : ofRefusal(outcome, isBroken);
}

function ofTable(stdout: string): string | null {
  counts.tables += 1;
  if (/NaN|Infinity|null/.test(stdout)) return `not a number in ${stdout.slice(0, 300)}`;
  const { rows, capacityL } = JSON.parse(stdout) as {
    capacityL: number;
    rows: { volumeL: number }[];
  };
  if (!(capacityL > 0)) return `a capacity of ${capacityL} L`;
  const falls = rows.some(
    ({ volumeL }, i) => i > 0 && volumeL < rows[i - 1]!.volumeL - 1e-9 * capacityL,
  );
  return falls ? 'the litres fall' : null;
}

function ofRefusal({ stderr, exitCode }: StrapOutcome, isBroken: boolean): string | null {
  counts.refused += 1;
  if (pastTheSchema.test(stderr)) counts.refusedPastTheSchema += 1;
  if (exitCode !== 2) return `exit ${exitCode}: ${stderr}`;
  if (!/^[A-Z“"].*\.\n$/.test(stderr) || stderr.trim().includes('\n'))
    return `no sentence: ${stderr}`;
  return isBroken || isEmpty.test(stderr) ? null : `refused a sound design: ${stderr}`;
}

/** Random solids may take away all that there is. */
const isEmpty = /^The liquid space is empty/;
const pastTheSchema =
  /^(The liquid space|The outlet|The vent|The stick|The zero|Wall, thickness: the wall leaves)/;
