import { requirePermission } from '~/domain/access/permissions';
import type { Installation, NewInstallation } from '~/domain/installation/installation';
import type { Actor, Context } from '../context';
import { newId } from '../database/new-id';
import { insertInstallation } from '../database/repositories/installations';
import { scopeOf } from './scope-of';

export async function createInstallation(
  context: Context,
  actor: Actor,
  input: NewInstallation,
): Promise<Installation> {
  requirePermission(actor.role, 'installation.create');
  const { name, kind } = input;
  const id = newId();
  await insertInstallation(scopeOf(context, actor), {
    id,
    name,
    kind,
    createdBy: actor.userId,
    createdAt: context.clock.now(),
  });
  return { id, name, kind };
}
