import { endpoint } from '~/server/http/endpoint';
import { readIdempotencyKey } from '~/server/http/idempotency-key';
import { otherMethods } from '~/server/http/other-methods';
import { created, json } from '~/server/http/respond';
import { readingOperations } from '~/server/openapi/operations/readings';
import { listReadings } from '~/server/services/list-readings';
import { recordReading } from '~/server/services/record-reading';

export const GET = endpoint(readingOperations.listReadings, async ({ context, actor, id, query }) =>
  json(await listReadings(context, actor, { tankId: id, most: query.most })),
);

export const POST = endpoint(
  readingOperations.recordReading,
  async ({ context, actor, id, body, request }) => {
    const idempotencyKey = readIdempotencyKey(request);
    return created(
      await recordReading(context, actor, { tankId: id, idempotencyKey, reading: body }),
    );
  },
);

export const ALL = otherMethods({ GET, POST });
