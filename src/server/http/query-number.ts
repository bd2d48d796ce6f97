import { z } from 'zod/v4';

/** A number in an address: digits with a point. An empty text, "1e5" and "0x10" are none. */
export function queryNumber(sentence: string) {
  return z
    .string(sentence)
    .regex(/^-?\d{1,15}(\.\d{1,20})?$/, { error: sentence, abort: true })
    .transform(Number)
    .pipe(z.number());
}
