import type { Me } from '~/domain/access/member';
import { requirePermission } from '~/domain/access/permissions';
import type { Actor, Context } from '../context';

/** Who is signed in, and where. */
export async function readWorkshop(_context: Context, actor: Actor): Promise<Me> {
  requirePermission(actor.role, 'workshop.read');
  const { name, email, role, workshopName } = actor;
  return { name, email, role, workshopName };
}
