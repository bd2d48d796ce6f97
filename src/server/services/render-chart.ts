import { requirePermission } from '~/domain/access/permissions';
import { buildChart } from '~/domain/report/chart';
import type { ChartOptions } from '~/domain/report/chart-options';
import type { TankDocument } from '~/domain/tank/document';
import type { Actor, Context } from '../context';
import { findInstallation } from '../database/repositories/installations';
import { listRevisionHeads } from '../database/repositories/revisions';
import { namesOfUsers } from '../database/repositories/users';
import { drawChart } from '../pdf/draw-chart';
import { meshFilesOf } from './mesh-files';
import { revisionInSight } from './revision-in-sight';
import { scopeOf } from './scope-of';
import { issuedSettings } from './settings-of';
import { soundRows } from './sound-rows';

/** The dip chart of a revision, from what was frozen with it; an old one says that it is superseded. */
export async function renderChart(
  context: Context,
  actor: Actor,
  input: { revisionId: string; options: ChartOptions },
): Promise<{ fileName: string; pdf: Buffer }> {
  requirePermission(actor.role, 'chart.print');
  const scope = scopeOf(context, actor);
  const { revision, tank, current } = await revisionInSight(scope, actor, input.revisionId);
  const installation = await findInstallation(scope, tank.installationId);
  if (installation === null) throw new Error(`Tank ${tank.id} has no installation.`);
  const revisions = await listRevisionHeads(scope, tank.id);
  const before = revisions.find(({ number }) => number === revision.number - 1);
  const names = await namesOfUsers(context.database, [revision.issuedBy]);
  const design = JSON.parse(revision.design) as TankDocument;
  const { letter, note, hash, heightMm, levelPerReading, capacityL, errorL } = revision;

  const report = buildChart({
    workshopName: actor.workshopName,
    installation: { name: installation.name, kind: installation.kind },
    tankName: tank.name,
    revision: {
      letter,
      issuedAt: revision.issuedAt.toISOString(),
      issuedBy: names.get(revision.issuedBy) ?? '',
      replaces: before?.letter ?? null,
      note,
      hash,
      current,
    },
    design,
    settings: issuedSettings(revision),
    heightMm,
    levelPerReading,
    capacityL,
    errorL,
    brimPlusMinusL: revision.brimPlusMinusL,
    rows: await soundRows(scope, revision),
    sketch: await context.computePool.sketch(design, await meshFilesOf(context, scope, design)),
    options: input.options,
  });
  return { fileName: `${tank.name} ${letter}.pdf`, pdf: await drawChart(report) };
}
