import type { Transaction } from 'sequelize';
import type { Scope } from '../database/scope';
import type { Actor, Context } from '../context';

/** Where this actor's queries work: the workshop of the session. */
export function scopeOf(context: Context, actor: Actor, transaction?: Transaction): Scope {
  return { database: context.database, workshopId: actor.workshopId, transaction };
}
