import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { serviceOperations } from '~/server/openapi/operations/service';

export const GET = endpoint(serviceOperations.healthz, async () => json({ alive: true }));

export const ALL = otherMethods({ GET });
