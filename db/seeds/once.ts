import { QueryTypes } from 'sequelize';
import type { Context } from '../../src/server/context';

/**
 * Runs a seed until it has once gone through, and never again: what people change or remove later
 * stays as they left it. False when it was done before.
 */
export async function once(
  context: Context,
  name: string,
  seed: (context: Context) => Promise<unknown>,
): Promise<boolean> {
  const { sequelize } = context.database;
  const done = await sequelize.query('SELECT name FROM applied_seeds WHERE name = ?', {
    replacements: [name],
    type: QueryTypes.SELECT,
  });
  if (done.length > 0) return false;
  await seed(context);
  await sequelize.query('INSERT IGNORE INTO applied_seeds (name, applied_at) VALUES (?, ?)', {
    replacements: [name, context.clock.now()],
  });
  return true;
}
