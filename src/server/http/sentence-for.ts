import type { z } from 'zod/v4';

const words: Readonly<Record<string, string>> = {
  string: 'a text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  object: 'an object of named fields',
  array: 'a list',
  tuple: 'a list',
  null: 'null',
};

/** Sentences for faults that a schema has no words of its own for. */
export function sentenceFor(issue: z.core.$ZodRawIssue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      return `Give ${words[issue.expected] ?? `a value of the type ${issue.expected}`} here.`;
    case 'invalid_value':
      return `Give ${issue.values.map((value) => JSON.stringify(value)).join(' or ')} here.`;
    case 'too_small':
      return `Give ${issue.origin === 'number' ? 'a number of' : 'at least'} ${issue.minimum}${issue.origin === 'number' ? ' or more' : ''} here.`;
    case 'too_big':
      return `Give ${issue.origin === 'number' ? 'a number of' : 'at most'} ${issue.maximum}${issue.origin === 'number' ? ' or less' : ''} here.`;
    default:
      return undefined;
  }
}
