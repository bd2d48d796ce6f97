import type { z } from 'zod/v4';
import { DipwrightError, type FieldFault } from '../errors';
import { tankDocument, type TankDocument } from './document';
import { valueAt } from './value-at';

/**
 * A design as it came from outside, checked. Throws `invalid`: one fault a field, with its JSON pointer and a
 * sentence that names the solid by its id and the field ("Solid "ramp", height: a length is more than 0 mm.").
 */
export function parseDesign(value: unknown): TankDocument {
  const parsed = tankDocument.safeParse(value);
  if (parsed.success) return parsed.data;
  const faults = designFaults(parsed.error.issues, value);
  throw new DipwrightError('invalid', faults[0]!.detail, { faults });
}

type Issue = z.core.$ZodIssue;

/** The issues of a document's schema as faults; `value` is the whole document. */
export function designFaults(issues: readonly Issue[], value: unknown): FieldFault[] {
  return issues.flatMap((issue) => {
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) =>
        fault([...issue.path, key], 'there is no such field here.', value),
      );
    }
    if (
      issue.code === 'invalid_type' &&
      valueAt(value, issue.path) === undefined &&
      issue.path.length > 0
    ) {
      return [fault(issue.path, 'this field is missing.', value)];
    }
    return [fault(issue.path, plainSentence(issue), value)];
  });
}

/** The schema's own sentence; where it has none, what the field should be. */
function plainSentence(issue: Issue): string {
  if (!issue.message.startsWith('Invalid input')) return issue.message;
  if (issue.path.length === 0) return 'A design is a JSON object with "format": "dipwright-tank".';
  const expected = issue.code === 'invalid_type' ? issue.expected : 'value';
  if (expected === 'object') return 'Give an object in braces.';
  return expected === 'array' || expected === 'tuple'
    ? 'Give a list in brackets.'
    : `Give a ${expected}.`;
}

function fault(path: readonly PropertyKey[], sentence: string, value: unknown): FieldFault {
  const pointer = path
    .map((key) => `/${String(key).replace(/~/g, '~0').replace(/\//g, '~1')}`)
    .join('');
  const place = placeWords(path, value);
  const [first = '', ...rest] = sentence;
  // a sentence that begins with a name of the format keeps its capital
  const lowered = /^[A-Z]{2}/.test(sentence) ? sentence : first.toLowerCase() + rest.join('');
  return { pointer, detail: place === '' ? sentence : `${place}: ${lowered}` };
}

function placeWords(path: readonly PropertyKey[], value: unknown): string {
  const ofSolid = path[0] === 'solids' && typeof path[1] === 'number';
  const words = (ofSolid ? path.slice(2) : path).map((key) =>
    typeof key === 'number' ? `number ${key + 1}` : String(key),
  );
  if (!ofSolid) return capital(words.join(', '));
  const id = valueAt(value, ['solids', path[1]!, 'id']);
  const named =
    typeof id === 'string' && id !== '' ? `"${id.slice(0, 64)}"` : String(Number(path[1]) + 1);
  return [`Solid ${named}`, ...words].join(', ');
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
