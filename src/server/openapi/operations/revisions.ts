import { z } from 'zod/v4';
import { chartOptions } from '~/domain/report/chart-options';
import { depthAnswer } from '~/domain/table/depth-answer';
import { computedTable, computeRequest, issuedRow } from '~/domain/table/request';
import { lookUp, newRevision, revisionSummary } from '~/domain/tank/tank';
import { operation } from '../../http/operation';
import { queryNumber } from '../../http/query-number';

const noun = 'revision';
const tag = 'Revisions';

/** Exactly one of the two. */
const readingQuery = z
  .strictObject({
    depthMm: queryNumber('Give depthMm in millimetres, such as 150 or 150.5.').optional(),
    ullageMm: queryNumber('Give ullageMm in millimetres, such as 150 or 150.5.').optional(),
  })
  .superRefine(({ depthMm, ullageMm }, context) => {
    // a faulty one of the two is told already, and left out of what is seen here
    if (context.issues.length > 0) return;
    if ((depthMm === undefined) === (ullageMm === undefined)) {
      const message =
        'Give either depthMm (up from the zero) or ullageMm (down from the top of the stick).';
      context.addIssue({ code: 'custom', path: ['depthMm'], message });
    }
  });

export const revisionOperations = {
  computeTable: operation({
    id: 'computeTable',
    method: 'POST',
    path: '/api/v1/compute',
    tag,
    summary: 'The table of any design; nothing is stored, no account is needed',
    access: 'anybody',
    limit: 'compute',
    body: computeRequest,
    answers: [{ status: 200, description: 'The table.', schema: computedTable }],
    problems: [429, 503],
  }),
  issueRevision: operation({
    id: 'issueRevision',
    method: 'POST',
    path: '/api/v1/tanks/{id}/revisions',
    tag,
    summary: 'Issue: compute the table of the draft and freeze it under the next letter',
    access: 'member',
    noun: 'tank',
    body: newRevision,
    answers: [{ status: 201, description: 'Issued.', schema: revisionSummary }],
    problems: [403, 409, 503],
  }),
  listRevisions: operation({
    id: 'listRevisions',
    method: 'GET',
    path: '/api/v1/tanks/{id}/revisions',
    tag,
    summary: 'Revisions of a tank, the current one first',
    access: 'member',
    noun: 'tank',
    answers: [{ status: 200, description: 'The list.', schema: z.array(revisionSummary) }],
  }),
  readRevision: operation({
    id: 'readRevision',
    method: 'GET',
    path: '/api/v1/revisions/{id}',
    tag,
    summary: 'A revision',
    access: 'member',
    noun,
    answers: [{ status: 200, description: 'The revision.', schema: revisionSummary }],
  }),
  readTable: operation({
    id: 'readTable',
    method: 'GET',
    path: '/api/v1/revisions/{id}/table',
    tag,
    summary: 'The table as issued',
    access: 'member',
    noun,
    answers: [
      {
        status: 200,
        description: 'Revision and rows.',
        schema: z.object({ revision: revisionSummary, rows: z.array(issuedRow) }),
      },
    ],
  }),
  readTableCsv: operation({
    id: 'readTableCsv',
    method: 'GET',
    path: '/api/v1/revisions/{id}/table.csv',
    tag,
    summary: 'The table as issued, for a spreadsheet',
    access: 'member',
    noun,
    answers: [
      {
        status: 200,
        description: 'Columns depthMm, volumeL, surfaceCm2, plusMinusL, tank, revision.',
        schema: z.string(),
        mediaType: 'text/csv',
      },
    ],
  }),
  lookUpVolume: operation({
    id: 'lookUpVolume',
    method: 'GET',
    path: '/api/v1/revisions/{id}/volume',
    tag,
    summary: 'Litres from a dip, or from the space above the liquid',
    access: 'member',
    noun,
    query: readingQuery,
    answers: [{ status: 200, description: 'What stands in the tank.', schema: lookUp }],
  }),
  lookUpDepth: operation({
    id: 'lookUpDepth',
    method: 'GET',
    path: '/api/v1/revisions/{id}/depth',
    tag,
    summary: 'The reading at which so many litres stand',
    access: 'member',
    noun,
    query: z.strictObject({ volumeL: queryNumber('Give volumeL in litres, such as 55.5.') }),
    answers: [{ status: 200, description: 'The reading.', schema: depthAnswer }],
  }),
  renderChart: operation({
    id: 'renderChart',
    method: 'GET',
    path: '/api/v1/revisions/{id}/chart.pdf',
    tag,
    summary: 'The dip chart to print',
    access: 'member',
    noun,
    query: chartOptions,
    answers: [
      { status: 200, description: 'A PDF.', schema: z.string(), mediaType: 'application/pdf' },
    ],
  }),
};
