import type { z } from 'zod/v4';
import { DipwrightError } from '~/domain/errors';
import type { computeRequest, ComputedTable } from '~/domain/table/request';
import type { Actor, Context } from '../context';

/** The table of any design. Nothing is stored, so anybody may ask. */
export async function computeTable(
  context: Context,
  _actor: Actor | null,
  input: z.infer<typeof computeRequest>,
): Promise<ComputedTable> {
  const { design, stepMm, atMm } = input;
  const readings = stepMm === undefined ? { atMm: atMm ?? [] } : { stepMm };
  try {
    return await context.computePool.table(design, readings);
  } catch (error) {
    throw error instanceof DipwrightError ? pointingIntoRequest(error) : error;
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
