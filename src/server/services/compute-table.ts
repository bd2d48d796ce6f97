import type { z } from 'zod/v4';
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
  return context.computePool.table(design, readings);
}
