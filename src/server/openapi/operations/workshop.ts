import { z } from 'zod/v4';
import { signUp } from '~/domain/access/account';
import { member } from '~/domain/access/member';
import { installation, newInstallation } from '~/domain/installation/installation';
import { liquidCodes } from '~/domain/liquid/liquids';
import { operation } from '../../http/operation';

export const listedLiquid = z.object({
  code: z.enum(liquidCodes),
  name: z.string(),
  densityKgPerM3: z.number().nullable(),
  watch: z.enum(['low', 'high']),
  safeFillPercent: z.number(),
});

export const workshopOperations = {
  signUp: operation({
    id: 'signUp',
    method: 'POST',
    path: '/api/v1/workshops',
    tag: 'People',
    summary: 'Open a workshop: whoever opens it is its manager, and signed in',
    access: 'anybody',
    limit: 'workshops',
    body: signUp,
    answers: [
      {
        status: 201,
        description: 'The workshop stands.',
        schema: z.object({ workshopId: z.string() }),
        headers: { 'Set-Cookie': 'The session of the manager.' },
      },
    ],
    problems: [409, 429],
  }),
  listMembers: operation({
    id: 'listMembers',
    method: 'GET',
    path: '/api/v1/members',
    tag: 'People',
    summary: 'Members of the workshop',
    access: 'member',
    answers: [{ status: 200, description: 'By name.', schema: z.array(member) }],
    problems: [403],
  }),
  listLiquids: operation({
    id: 'listLiquids',
    method: 'GET',
    path: '/api/v1/liquids',
    tag: 'Tanks',
    summary: 'The liquids a tank may hold',
    access: 'anybody',
    answers: [{ status: 200, description: 'The list.', schema: z.array(listedLiquid) }],
  }),
  listInstallations: operation({
    id: 'listInstallations',
    method: 'GET',
    path: '/api/v1/installations',
    tag: 'Tanks',
    summary: 'Vehicles, boats and places that tanks are fitted in',
    access: 'member',
    answers: [{ status: 200, description: 'By name.', schema: z.array(installation) }],
  }),
  createInstallation: operation({
    id: 'createInstallation',
    method: 'POST',
    path: '/api/v1/installations',
    tag: 'Tanks',
    summary: 'Add a vehicle, boat or place',
    access: 'member',
    body: newInstallation,
    answers: [{ status: 201, description: 'Added.', schema: installation }],
    problems: [403],
  }),
};
