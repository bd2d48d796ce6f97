import { z } from 'zod/v4';
import { handover, newHandover } from '~/domain/access/handover';
import { tankDocument } from '~/domain/tank/document';
import { newTank, tank, tankChange } from '~/domain/tank/tank';
import { operation } from '../../http/operation';

const noun = 'tank';
const tag = 'Tanks';
const etag = { ETag: 'The version of the draft: give it back as If-Match when saving.' };

export const tankOperations = {
  listTanks: operation({
    id: 'listTanks',
    method: 'GET',
    path: '/api/v1/tanks',
    tag,
    summary: 'Tanks of the workshop; for an owner those handed over to them',
    access: 'member',
    answers: [{ status: 200, description: 'By name.', schema: z.array(tank) }],
  }),
  createTank: operation({
    id: 'createTank',
    method: 'POST',
    path: '/api/v1/tanks',
    tag,
    summary: 'Add a tank and its draft (a plain box where no design is sent)',
    access: 'member',
    body: newTank,
    answers: [{ status: 201, description: 'Added.', schema: tank }],
    problems: [403],
  }),
  readTank: operation({
    id: 'readTank',
    method: 'GET',
    path: '/api/v1/tanks/{id}',
    tag,
    summary: 'A tank, its settings and its current revision',
    access: 'member',
    noun,
    answers: [{ status: 200, description: 'The tank.', schema: tank }],
  }),
  changeTank: operation({
    id: 'changeTank',
    method: 'PATCH',
    path: '/api/v1/tanks/{id}',
    tag,
    summary: 'Change name or settings; what was issued keeps its own',
    access: 'member',
    noun,
    body: tankChange,
    answers: [{ status: 200, description: 'Changed.', schema: tank }],
    problems: [403],
  }),
  readDesign: operation({
    id: 'readDesign',
    method: 'GET',
    path: '/api/v1/tanks/{id}/design',
    tag,
    summary: 'The draft of a tank: its design document',
    access: 'member',
    noun,
    answers: [{ status: 200, description: 'The draft.', schema: tankDocument, headers: etag }],
    problems: [403],
  }),
  saveDesign: operation({
    id: 'saveDesign',
    method: 'PUT',
    path: '/api/v1/tanks/{id}/design',
    tag,
    summary: 'Save the draft over the version that was read',
    access: 'member',
    noun,
    headers: { 'If-Match': { description: 'The ETag that was read.', required: true } },
    body: tankDocument,
    answers: [{ status: 200, description: 'Saved.', schema: tankDocument, headers: etag }],
    problems: [403, 412, 428],
  }),
  handOverTank: operation({
    id: 'handOverTank',
    method: 'POST',
    path: '/api/v1/tanks/{id}/handovers',
    tag,
    summary: 'Hand the tank over: from then on this owner sees it',
    access: 'member',
    noun,
    body: newHandover,
    answers: [{ status: 201, description: 'Handed over.', schema: handover }],
    problems: [403],
  }),
  listHandovers: operation({
    id: 'listHandovers',
    method: 'GET',
    path: '/api/v1/tanks/{id}/handovers',
    tag,
    summary: 'The owners who see this tank',
    access: 'member',
    noun,
    answers: [{ status: 200, description: 'In the order handed over.', schema: z.array(handover) }],
    problems: [403],
  }),
};
