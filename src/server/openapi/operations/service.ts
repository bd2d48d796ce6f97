import { z } from 'zod/v4';
import { operation } from '../../http/operation';

const tag = 'Operation';

export const readiness = z.object({
  ready: z.boolean(),
  checks: z.array(z.object({ name: z.string(), fit: z.boolean(), detail: z.string() })),
});

export const serviceOperations = {
  healthz: operation({
    id: 'readHealth',
    method: 'GET',
    path: '/healthz',
    tag,
    summary: 'The process is alive',
    access: 'anybody',
    answers: [{ status: 200, description: 'Alive.', schema: z.object({ alive: z.literal(true) }) }],
  }),
  readyz: operation({
    id: 'readReadiness',
    method: 'GET',
    path: '/readyz',
    tag,
    summary: 'Database, migrations and disk are fit for work',
    access: 'anybody',
    answers: [
      { status: 200, description: 'Ready.', schema: readiness },
      { status: 503, description: 'Not ready: the checks say why.', schema: readiness },
    ],
  }),
  openapi: operation({
    id: 'readOpenApi',
    method: 'GET',
    path: '/api/openapi.json',
    tag,
    summary: 'This document',
    access: 'anybody',
    answers: [{ status: 200, description: 'OpenAPI 3.1.', schema: z.looseObject({}) }],
  }),
};
