import type { Sequelize } from 'sequelize';

/** Meshes that a workshop uploaded; their bytes stand in the storage under the hash. May run again. */
const statements = [
  `CREATE TABLE IF NOT EXISTS meshes (
    workshop_id CHAR(36) NOT NULL,
    id CHAR(36) NOT NULL,
    hash CHAR(64) NOT NULL,
    name VARCHAR(120) NOT NULL,
    triangles INT NOT NULL,
    bytes INT NOT NULL,
    unit VARCHAR(2) NOT NULL,
    created_by CHAR(36) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, id),
    CONSTRAINT meshes_unit CHECK (unit IN ('mm', 'cm', 'm', 'in')),
    CONSTRAINT meshes_to_member FOREIGN KEY (workshop_id, created_by)
      REFERENCES memberships (workshop_id, user_id)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`,
];

export async function up({ context }: { context: Sequelize }): Promise<void> {
  for (const statement of statements) await context.query(statement);
}
