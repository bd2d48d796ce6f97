import { notFound } from '~/domain/errors';
import type { Actor } from '../context';
import type { TankRecord } from '../database/models/tank';
import { isId } from '../database/new-id';
import { isHandedOver } from '../database/repositories/handovers';
import { findTank } from '../database/repositories/tanks';
import type { Scope } from '../database/scope';

/**
 * The tank, if it is of the actor's workshop and, for an owner, was handed over to them; anything
 * else is "not found", so that nobody learns what exists elsewhere.
 */
export async function tankInSight(
  scope: Scope,
  actor: Actor,
  tankId: string,
  options: { lock?: boolean } = {},
): Promise<TankRecord> {
  const tank = isId(tankId) ? await findTank(scope, tankId, options) : null;
  if (tank === null) throw notFound('tank');
  if (actor.role === 'owner' && !(await isHandedOver(scope, tankId, actor.userId))) {
    throw notFound('tank');
  }
  return tank;
}
