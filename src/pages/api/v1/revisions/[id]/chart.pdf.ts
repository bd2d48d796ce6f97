import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { file } from '~/server/http/respond';
import { revisionOperations } from '~/server/openapi/operations/revisions';
import { renderChart } from '~/server/services/render-chart';

export const GET = endpoint(
  revisionOperations.renderChart,
  async ({ context, actor, id, query }) => {
    const { fileName, pdf } = await renderChart(context, actor, { revisionId: id, options: query });
    return file(pdf, 'application/pdf', fileName, 'inline');
  },
);

export const ALL = otherMethods({ GET });
