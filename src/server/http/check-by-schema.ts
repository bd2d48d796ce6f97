import type { z } from 'zod/v4';
import { DipwrightError, type FieldFault } from '~/domain/errors';
import { sentenceFor } from './sentence-for';

/** What was sent, as the schema reads it. Throws `invalid` with a pointer to every fault. */
export function checkBySchema<T>(schema: z.ZodType<T>, value: unknown): T {
  const read = schema.safeParse(value, { error: sentenceFor });
  if (read.success) return read.data;
  const faults = read.error.issues.flatMap(faultsOf).slice(0, 100);
  const [first] = faults;
  const detail = first === undefined ? 'What was sent does not fit.' : first.detail;
  throw new DipwrightError('invalid', detail, { faults });
}

function faultsOf(issue: z.core.$ZodIssue): FieldFault[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      pointer: pointerTo([...issue.path, key]),
      detail: `There is no field "${key.slice(0, 64)}" here: leave it out.`,
    }));
  }
  return [{ pointer: pointerTo(issue.path), detail: issue.message }];
}

/** RFC 6901. */
export function pointerTo(path: readonly PropertyKey[]): string {
  return path
    .map((step) => `/${String(step).replaceAll('~', '~0').replaceAll('/', '~1')}`)
    .join('');
}
