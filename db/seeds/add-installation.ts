import type { Installation, NewInstallation } from '../../src/domain/installation/installation';
import type { Actor } from '../../src/domain/access/actor';
import type { Context } from '../../src/server/context';
import { createInstallation } from '../../src/server/services/create-installation';
import { listInstallations } from '../../src/server/services/list-installations';

/** A vehicle, boat or place of the actor's workshop; one of that name is there only once. */
export async function addInstallation(
  context: Context,
  actor: Actor,
  input: NewInstallation,
): Promise<Installation> {
  const installations = await listInstallations(context, actor);
  return (
    installations.find(({ name }) => name === input.name) ??
    createInstallation(context, actor, input)
  );
}
