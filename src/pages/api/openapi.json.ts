import { version } from '../../../package.json';
import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { openApiDocument } from '~/server/openapi/document';
import { serviceOperations } from '~/server/openapi/operations/service';

export const GET = endpoint(serviceOperations.openapi, async ({ context }) =>
  json(openApiDocument(context.config.http.origin, version), {
    headers: { 'cache-control': 'no-cache' },
  }),
);

export const ALL = otherMethods({ GET });
