import { readFile } from 'node:fs/promises';
import { parseArgs } from 'node:util';
import { DipwrightError, invalid } from '~/domain/errors';
import { computeTable } from '~/domain/table/compute-table';
import type { ComputedTable, Readings } from '~/domain/table/request';
import { parseDesign } from '~/domain/tank/parse-design';
import { loadMeshes } from './load-meshes';

const usage =
  'Give a design file: npm run --silent strap -- FILE [--step MM | --at MM,MM,…] [--csv]';

/** What the command prints and how it ends. */
export interface StrapOutcome {
  stdout: string;
  stderr: string;
  exitCode: 0 | 1 | 2;
}

/**
 * strap FILE [--step MM | --at MM,MM,…] [--csv]: the table of a design file on stdout, exit 0. Otherwise one
 * sentence on stderr: exit 2 when the design (or a reading asked of it) is at fault, 1 for anything else.
 */
export async function runStrap(args: readonly string[]): Promise<StrapOutcome> {
  try {
    const { file, readings, csv } = readArguments([...args]);
    const design = parseDesign(await readDesign(file));
    await loadMeshes(design, file);
    const table = await computeTable(design, readings);
    const stdout = csv ? asCsv(table) : `${JSON.stringify(table, null, 2)}\n`;
    return { stdout, stderr: '', exitCode: 0 };
  } catch (error) {
    const sentence = error instanceof Error ? error.message : String(error);
    const atFault = error instanceof DipwrightError && error.code === 'invalid';
    return {
      stdout: '',
      stderr: `${sentence.replace(/\s*\n\s*/g, ' ')}\n`,
      exitCode: atFault ? 2 : 1,
    };
  }
}

function readArguments(args: string[]): { file: string; readings: Readings; csv: boolean } {
  const { values, positionals } = parsed(args);
  const [file, ...more] = positionals;
  if (file === undefined || more.length > 0) throw new Error(usage);
  if (values.step !== undefined && values.at !== undefined)
    throw new Error('Give either --step or --at, not both.');
  return { file, readings: readingsOf(values.step, values.at), csv: values.csv };
}

function parsed(args: string[]) {
  try {
    return parseArgs({
      args,
      allowPositionals: true,
      options: {
        step: { type: 'string' },
        at: { type: 'string' },
        csv: { type: 'boolean', default: false },
      },
    });
  } catch (error) {
    throw new Error(usage, { cause: error });
  }
}

function readingsOf(step: string | undefined, at: string | undefined): Readings {
  if (at !== undefined) return { atMm: at.split(',').map((text) => millimetres('--at', text)) };
  const stepMm = step === undefined ? 10 : millimetres('--step', step);
  if (stepMm <= 0) throw new Error('The --step is more than 0 mm.');
  return { stepMm };
}

function millimetres(option: string, text: string): number {
  const value = text.trim() === '' ? NaN : Number(text);
  if (!Number.isFinite(value)) throw new Error(`After ${option} give millimetres, not "${text}".`);
  return value;
}

async function readDesign(file: string): Promise<unknown> {
  const text = await readFile(file, 'utf8').catch((error: unknown) => {
    throw new Error(`The file ${file} cannot be read.`, { cause: error });
  });
  try {
    return JSON.parse(text) as unknown;
  } catch {
    throw invalid(
      '',
      `The file ${file} is not JSON: a design is a JSON object with "format": "dipwright-tank".`,
    );
  }
}

function asCsv({ rows }: ComputedTable): string {
  const lines = rows.map(({ depthMm, volumeL, surfaceCm2, centroidMm }) =>
    [depthMm, volumeL, surfaceCm2, ...centroidMm].join(','),
  );
  return `${['depthMm,volumeL,surfaceCm2,centroidXMm,centroidYMm,centroidZMm', ...lines].join('\n')}\n`;
}
