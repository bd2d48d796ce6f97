import type { z } from 'zod/v4';
import { DipwrightError, type FieldFault } from '~/domain/errors';
import { tankDocument } from '~/domain/tank/document';
import { designFaults } from '~/domain/tank/parse-design';
import { valueAt } from '~/domain/tank/value-at';
import { sentenceFor } from './sentence-for';

/**
 * What was sent, as the schema reads it. Throws `invalid` with a pointer to every fault; a fault of a
 * design, sent alone or as the field `design`, names its solid and field.
 */
export function checkBySchema<T>(schema: z.ZodType<T>, value: unknown): T {
  const read = schema.safeParse(value, { error: sentenceFor });
  if (read.success) return read.data;
  const designAt = (schema as unknown) === tankDocument ? [] : ['design'];
  const faults = read.error.issues
    .flatMap((issue) => faultsInDesign(issue, value, designAt) ?? faultsOf(issue))
    .slice(0, 100);
  const [first] = faults;
  const detail = first === undefined ? 'What was sent does not fit.' : first.detail;
  throw new DipwrightError('invalid', detail, { faults });
}

/** null when the fault lies outside the design, or the design as a whole is missing. */
function faultsInDesign(
  issue: z.core.$ZodIssue,
  value: unknown,
  designAt: readonly string[],
): FieldFault[] | null {
  const design = valueAt(value, designAt);
  if (design === undefined || !designAt.every((step, i) => issue.path[i] === step)) return null;
  const inside = { ...issue, path: issue.path.slice(designAt.length) };
  return designFaults([inside], design).map(({ pointer, detail }) => ({
    pointer: `${pointerTo(designAt)}${pointer}`,
    detail,
  }));
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
