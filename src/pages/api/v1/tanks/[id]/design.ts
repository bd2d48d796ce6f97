import { endpoint } from '~/server/http/endpoint';
import { readIfMatch } from '~/server/http/if-match';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { tankOperations } from '~/server/openapi/operations/tanks';
import { draftEtag } from '~/server/services/draft-etag';
import { readDraft, type Draft } from '~/server/services/read-draft';
import { saveDraft } from '~/server/services/save-draft';

const answer = ({ design, version }: Draft): Response =>
  json(design, { headers: { etag: draftEtag(version) } });

export const GET = endpoint(tankOperations.readDesign, async ({ context, actor, id }) =>
  answer(await readDraft(context, actor, { tankId: id })),
);

export const PUT = endpoint(
  tankOperations.saveDesign,
  async ({ context, actor, id, body, request }) => {
    const etags = readIfMatch(request);
    return answer(await saveDraft(context, actor, { tankId: id, etags, design: body }));
  },
);

export const ALL = otherMethods({ GET, PUT });
