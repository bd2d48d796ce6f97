import { requirePermission } from '~/domain/access/permissions';
import { changedSettings } from '~/domain/tank/complete-settings';
import type { Tank, TankChange } from '~/domain/tank/tank';
import type { Actor, Context } from '../context';
import { updateTank } from '../database/repositories/tanks';
import { inTransaction } from '../database/transaction';
import { readTank } from './read-tank';
import { scopeOf } from './scope-of';
import { recordOfSettings, settingsOf } from './settings-of';
import { tankInSight } from './tank-in-sight';

/** Name and settings; what is not named stays. What was issued keeps its own settings. */
export async function changeTank(
  context: Context,
  actor: Actor,
  input: { tankId: string; change: TankChange },
): Promise<Tank> {
  requirePermission(actor.role, 'tank.change');
  const { tankId } = input;
  await inTransaction(context.database, async (transaction) => {
    const scope = scopeOf(context, actor, transaction);
    const tank = await tankInSight(scope, actor, tankId, { lock: true });
    const { name = tank.name, ...change } = input.change;
    await updateTank(scope, tankId, {
      name,
      ...recordOfSettings(changedSettings(settingsOf(tank), change)),
    });
  });
  return readTank(context, actor, { tankId });
}
