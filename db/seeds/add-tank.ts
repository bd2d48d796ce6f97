import type { Installation } from '../../src/domain/installation/installation';
import type { TankDocument } from '../../src/domain/tank/document';
import type { NewTank, Tank, TankChange } from '../../src/domain/tank/tank';
import type { Context } from '../../src/server/context';
import { changeTank } from '../../src/server/services/change-tank';
import { createTank } from '../../src/server/services/create-tank';
import { handOverTank } from '../../src/server/services/hand-over-tank';
import { issueRevision } from '../../src/server/services/issue-revision';
import { listReadings } from '../../src/server/services/list-readings';
import { listRevisions } from '../../src/server/services/list-revisions';
import { listTanks } from '../../src/server/services/list-tanks';
import { readTank } from '../../src/server/services/read-tank';
import { recordReading } from '../../src/server/services/record-reading';
import type { Team } from './add-workshop';

export interface TankStory {
  name: string;
  liquid: NewTank['liquid'];
  design: TankDocument;
  settings?: NewTank['settings'];
  /** Each revision in turn: what is changed before it is issued, so many hours ago. */
  issues: readonly { hoursAgo: number; change?: TankChange; stepMm: number; note?: string }[];
  handedOver: boolean;
  /** Dips in the order taken, by whom, so many hours ago. */
  readings: readonly { hoursAgo: number; depthMm: number; by: 'fitter' | 'owner'; note?: string }[];
}

/**
 * A tank and all that happened to it, through the use cases, so that its tables are computed like
 * any other. Begun and broken off, it goes on where it stopped.
 */
export async function addTank(
  context: Context,
  team: Team,
  installation: Installation,
  story: TankStory,
): Promise<Tank> {
  const { designer, fitter, owner } = team;
  const { name, liquid, design, settings } = story;
  const tanks = await listTanks(context, designer);
  const known = tanks.find((tank) => tank.name === name && tank.installationId === installation.id);
  const input = { installationId: installation.id, name, liquid, design, settings };
  const tank = known ?? (await createTank(context, designer, input));
  const tankId = tank.id;

  const issued = await listRevisions(context, designer, { tankId });
  for (const { hoursAgo, change, ...issue } of story.issues.slice(issued.length)) {
    const then = asOf(context, hoursAgo);
    if (change !== undefined) await changeTank(then, designer, { tankId, change });
    await issueRevision(then, designer, { tankId, ...issue });
  }
  if (story.handedOver) await handOverTank(context, fitter, { tankId, userId: owner.userId });

  const kept = await listReadings(context, designer, { tankId });
  for (const [index, { hoursAgo, depthMm, by, note }] of story.readings.entries()) {
    if (index < kept.length) continue;
    const then = asOf(context, hoursAgo);
    const reading = { at: then.clock.now().toISOString(), depthMm, note };
    await recordReading(then, team[by], { tankId, idempotencyKey: `seed-${index}`, reading });
  }
  return readTank(context, designer, { tankId });
}

/** The same context some hours earlier, on the full minute. */
function asOf(context: Context, hoursAgo: number): Context {
  const minute = 60_000;
  const now = (): Date => {
    const at = context.clock.now().getTime() - hoursAgo * 60 * minute;
    return new Date(Math.floor(at / minute) * minute);
  };
  return { ...context, clock: { now } };
}
