import type { Sequelize } from 'sequelize';

/** A missing right, or a server that asks for a greater one while its binary log is on. */
const missingRight = [1044, 1142, 1227, 1370, 1419];

const guards = ['revisions', 'strapping_rows'].flatMap((table) =>
  ['UPDATE', 'DELETE'].map(
    (event) => `CREATE TRIGGER IF NOT EXISTS ${table}_refuse_${event.toLowerCase()}
      BEFORE ${event} ON ${table} FOR EACH ROW
      SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'What was issued is never changed or removed.'`,
  ),
);

/**
 * Triggers by which the database itself refuses to change or remove an issued revision. Laid at
 * every start, so that a right given later takes effect. Returns a sentence when the right is missing.
 */
export async function guardIssued(sequelize: Sequelize): Promise<string | null> {
  try {
    for (const guard of guards) await sequelize.query(guard);
    return null;
  } catch (error) {
    const errno = (error as { parent?: { errno?: number } }).parent?.errno ?? 0;
    if (!missingRight.includes(errno)) throw error;
    return (
      'The database user may not create triggers, so only the program itself keeps issued revisions ' +
      'from being changed. Grant TRIGGER on this database (with a binary log on, also set ' +
      'log_bin_trust_function_creators=1) and start again.'
    );
  }
}
