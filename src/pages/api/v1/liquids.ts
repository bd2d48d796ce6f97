import { liquids } from '~/domain/liquid/liquids';
import { endpoint } from '~/server/http/endpoint';
import { otherMethods } from '~/server/http/other-methods';
import { json } from '~/server/http/respond';
import { workshopOperations } from '~/server/openapi/operations/workshop';

export const GET = endpoint(workshopOperations.listLiquids, async () =>
  json(
    Object.values(liquids).map(({ code, name, densityKgPerM3, watch, safeFillPercent }) => ({
      code,
      name,
      densityKgPerM3,
      watch,
      safeFillPercent,
    })),
  ),
);

export const ALL = otherMethods({ GET });
