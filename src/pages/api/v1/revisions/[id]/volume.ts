import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { lookUpVolume } from '~/server/services/look-up-volume';

export const GET = endpoint(
  revisionOperations.lookUpVolume,
  async ({ context, actor, id, query }) => {
    const { depthMm, ullageMm = 0 } = query;
    const reading = depthMm === undefined ? { ullageMm } : { depthMm };
    return json(await lookUpVolume(context, actor, { revisionId: id, ...reading }));
  },
);

export const ALL = otherMethods({ GET });
