import { csv } from '~/server/http/csv';
import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { file } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { readTable } from '~/server/services/read-table';

export const GET = endpoint(revisionOperations.readTableCsv, async ({ context, actor, id }) => {
  const { revision, tankName, rows } = await readTable(context, actor, { revisionId: id });
  const text = csv([
    ['depthMm', 'volumeL', 'surfaceCm2', 'plusMinusL', 'tank', 'revision'],
    ...rows.map(({ depthMm, volumeL, surfaceCm2, plusMinusL }) => [
      depthMm,
      volumeL,
      surfaceCm2,
      plusMinusL,
      tankName,
      revision.letter,
    ]),
  ]);
  return file(
    text,
    'text/csv; charset=utf-8; header=present',
    `${tankName} ${revision.letter}.csv`,
  );
});

export const ALL = otherMethods({ GET });
