import type { Sequelize } from 'sequelize';

/**
 * Closer rows for the curve between those that are printed, the ± of the brim of a revision, and the ± of single
 * sizes of a tank. What was issued before has no closer rows and no ± of its own for the brim (NULL). Each
 * statement may run again.
 */
const statements = [
  'ALTER TABLE strapping_rows ADD COLUMN IF NOT EXISTS between_rows BOOLEAN NOT NULL DEFAULT FALSE',
  'ALTER TABLE revisions ADD COLUMN IF NOT EXISTS brim_plus_minus_l DOUBLE NULL',
  'ALTER TABLE tanks ADD COLUMN IF NOT EXISTS own_size_plus_minus TEXT NULL',
];

export async function up({ context }: { context: Sequelize }): Promise<void> {
  for (const statement of statements) await context.query(statement);
}
