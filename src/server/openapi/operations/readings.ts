import { z } from 'zod/v4';
import { newReading, reading } from '~/domain/reading/reading';
import { operation } from '../../http/operation';
import { queryNumber } from '../../http/query-number';

const most = queryNumber('Give a whole number from 1 to 500.').pipe(
  z
    .int('Give a whole number from 1 to 500.')
    .min(1, 'Give 1 or more.')
    .max(500, 'Give 500 or less.'),
);

export const readingOperations = {
  recordReading: operation({
    id: 'recordReading',
    method: 'POST',
    path: '/api/v1/tanks/{id}/readings',
    tag: 'Readings',
    summary: 'Keep a dip, with the litres that the current revision gives it',
    access: 'member',
    noun: 'tank',
    headers: {
      'Idempotency-Key': {
        description: 'A new one for every reading: sent again, the reading is kept once.',
        required: true,
      },
    },
    body: newReading,
    answers: [{ status: 201, description: 'Kept, now or the first time.', schema: reading }],
    problems: [403, 409],
  }),
  listReadings: operation({
    id: 'listReadings',
    method: 'GET',
    path: '/api/v1/tanks/{id}/readings',
    tag: 'Readings',
    summary: 'The last readings of a tank, latest first',
    access: 'member',
    noun: 'tank',
    query: z.strictObject({ most: most.optional() }),
    answers: [{ status: 200, description: 'At most 100 unless told.', schema: z.array(reading) }],
  }),
};
