import type { z } from 'zod/v4';
import { may } from '~/domain/access/permissions';
import { DipwrightError } from '~/domain/errors';
import type { computeRequest, ComputedTable } from '~/domain/table/request';
import type { Actor, Context } from '../context';
import { meshFilesOf, refuseMeshes } from './mesh-files';
import { scopeOf } from './scope-of';

/** The table of any design. Nothing is stored, so anybody may ask; the meshes of a workshop are its own. */
export async function computeTable(
  context: Context,
  actor: Actor | null,
  input: z.infer<typeof computeRequest>,
): Promise<ComputedTable> {
  const { design, stepMm, atMm } = input;
  const readings = stepMm === undefined ? { atMm: atMm ?? [] } : { stepMm };
  try {
    return await context.computePool.table(design, readings, await meshes());
  } catch (error) {
    throw error instanceof DipwrightError ? pointingIntoRequest(error) : error;
  }

  async function meshes() {
    if (actor !== null && may(actor.role, 'mesh.read')) {
      return meshFilesOf(context, scopeOf(context, actor), design);
    }
    refuseMeshes(design);
    return [];
  }
}

/** The engine points into the design; what was sent holds the design in a field of its own. */
function pointingIntoRequest({ code, message, faults, facts, cause }: DipwrightError) {
  return new DipwrightError(code, message, {
    faults: faults.map(({ pointer, detail }) => ({
      pointer: /^\/(stepMm|atMm)(\/|$)/.test(pointer) ? pointer : `/design${pointer}`,
      detail,
    })),
    facts,
    cause,
  });
}
