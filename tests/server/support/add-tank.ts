import type { TankDocument } from '~/domain/tank/document';
import type { NewTank, RevisionSummary, Tank } from '~/domain/tank/tank';
import { createInstallation } from '~/server/services/create-installation';
import { createTank } from '~/server/services/create-tank';
import { handOverTank } from '~/server/services/hand-over-tank';
import { issueRevision } from '~/server/services/issue-revision';
import type { Team } from '../../../db/seeds/add-workshop';
import { boxDesign } from './box-design';
import type { House } from './house';

export interface Made {
  installationId: string;
  tank: Tank;
  revision: RevisionSummary;
}

/** A draft in an installation of its own. */
export async function addDraft(
  house: House,
  team: Team,
  options: {
    name?: string;
    design?: TankDocument;
    settings?: NewTank['settings'];
    liquid?: NewTank['liquid'];
  } = {},
): Promise<{ installationId: string; tank: Tank }> {
  const { context } = house;
  const { name = 'Cistern', design = boxDesign(), settings, liquid = 'drinking-water' } = options;
  const installation = await createInstallation(context, team.designer, {
    name: `Hut of ${name}`,
    kind: 'place',
  });
  const input = { installationId: installation.id, name, liquid, design, settings };
  return { installationId: installation.id, tank: await createTank(context, team.designer, input) };
}

/** A tank with revision A, handed over to the owner. */
export async function addIssuedTank(
  house: House,
  team: Team,
  options: Parameters<typeof addDraft>[2] & { stepMm?: number } = {},
): Promise<Made> {
  const { context } = house;
  const draft = await addDraft(house, team, options);
  const tankId = draft.tank.id;
  const revision = await issueRevision(context, team.designer, {
    tankId,
    stepMm: options.stepMm ?? 10,
  });
  await handOverTank(context, team.fitter, { tankId, userId: team.owner.userId });
  return { ...draft, revision };
}
