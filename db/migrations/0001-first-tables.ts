import type { Sequelize } from 'sequelize';

const table = 'ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci';

/**
 * Every table that names a workshop links to its parents by (workshop_id, id), so that the
 * database itself refuses a link into another workshop. Each statement may run again.
 */
const statements = [
  `CREATE TABLE IF NOT EXISTS workshops (
    id CHAR(36) NOT NULL PRIMARY KEY,
    name VARCHAR(120) NOT NULL,
    created_at DATETIME(3) NOT NULL
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS users (
    id CHAR(36) NOT NULL PRIMARY KEY,
    name VARCHAR(120) NOT NULL,
    email VARCHAR(254) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
    password_hash VARCHAR(200) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    UNIQUE KEY users_email (email)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS memberships (
    workshop_id CHAR(36) NOT NULL,
    user_id CHAR(36) NOT NULL,
    role VARCHAR(16) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (workshop_id, user_id),
    KEY memberships_user (user_id),
    CONSTRAINT memberships_role CHECK (role IN ('manager', 'designer', 'fitter', 'owner')),
    CONSTRAINT memberships_to_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT memberships_to_user FOREIGN KEY (user_id) REFERENCES users (id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS sessions (
    token_hash CHAR(64) NOT NULL PRIMARY KEY,
    workshop_id CHAR(36) NOT NULL,
    user_id CHAR(36) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    expires_at DATETIME(3) NOT NULL,
    ends_at DATETIME(3) NOT NULL,
    KEY sessions_member (workshop_id, user_id),
    KEY sessions_user (user_id),
    KEY sessions_expiry (expires_at),
    CONSTRAINT sessions_to_member FOREIGN KEY (workshop_id, user_id)
      REFERENCES memberships (workshop_id, user_id) ON DELETE CASCADE
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS sign_in_attempts (
    account_hash CHAR(64) NOT NULL PRIMARY KEY,
    failures INT NOT NULL,
    last_at DATETIME(3) NOT NULL,
    blocked_until DATETIME(3) NOT NULL,
    KEY sign_in_attempts_age (last_at)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS installations (
    id CHAR(36) NOT NULL PRIMARY KEY,
    workshop_id CHAR(36) NOT NULL,
    name VARCHAR(120) NOT NULL,
    kind VARCHAR(16) NOT NULL,
    created_by CHAR(36) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    UNIQUE KEY installations_workshop (workshop_id, id),
    CONSTRAINT installations_kind CHECK (kind IN ('vehicle', 'boat', 'place')),
    CONSTRAINT installations_to_member FOREIGN KEY (workshop_id, created_by)
      REFERENCES memberships (workshop_id, user_id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS tanks (
    id CHAR(36) NOT NULL PRIMARY KEY,
    workshop_id CHAR(36) NOT NULL,
    installation_id CHAR(36) NOT NULL,
    name VARCHAR(120) NOT NULL,
    liquid VARCHAR(32) NOT NULL,
    density_kg_per_m3 DOUBLE NULL,
    safe_fill_percent DOUBLE NOT NULL,
    outlet_mm DOUBLE NULL,
    reference_height_mm DOUBLE NULL,
    measured_by VARCHAR(16) NOT NULL,
    size_plus_minus_mm DOUBLE NOT NULL,
    dip_plus_minus_mm DOUBLE NOT NULL,
    created_by CHAR(36) NOT NULL,
    created_at DATETIME(3) NOT NULL,
    UNIQUE KEY tanks_workshop (workshop_id, id),
    KEY tanks_installation (workshop_id, installation_id),
    CONSTRAINT tanks_to_installation FOREIGN KEY (workshop_id, installation_id)
      REFERENCES installations (workshop_id, id),
    CONSTRAINT tanks_to_member FOREIGN KEY (workshop_id, created_by)
      REFERENCES memberships (workshop_id, user_id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS drafts (
    tank_id CHAR(36) NOT NULL PRIMARY KEY,
    workshop_id CHAR(36) NOT NULL,
    design MEDIUMTEXT NOT NULL,
    design_hash CHAR(64) NOT NULL,
    version INT NOT NULL,
    saved_by CHAR(36) NOT NULL,
    saved_at DATETIME(3) NOT NULL,
    KEY drafts_workshop (workshop_id, tank_id),
    CONSTRAINT drafts_to_tank FOREIGN KEY (workshop_id, tank_id) REFERENCES tanks (workshop_id, id),
    CONSTRAINT drafts_to_member FOREIGN KEY (workshop_id, saved_by)
      REFERENCES memberships (workshop_id, user_id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS revisions (
    id CHAR(36) NOT NULL PRIMARY KEY,
    workshop_id CHAR(36) NOT NULL,
    tank_id CHAR(36) NOT NULL,
    number INT NOT NULL,
    letter VARCHAR(8) NOT NULL,
    design MEDIUMTEXT NOT NULL,
    settings TEXT NOT NULL,
    content_hash CHAR(64) NOT NULL,
    step_mm DOUBLE NOT NULL,
    height_mm DOUBLE NOT NULL,
    level_per_reading DOUBLE NOT NULL,
    capacity_l DOUBLE NOT NULL,
    error_l DOUBLE NOT NULL,
    row_count INT NOT NULL,
    hash CHAR(64) NOT NULL,
    note VARCHAR(500) NULL,
    issued_by CHAR(36) NOT NULL,
    issued_at DATETIME(3) NOT NULL,
    UNIQUE KEY revisions_number (tank_id, number),
    UNIQUE KEY revisions_workshop (workshop_id, tank_id, id),
    CONSTRAINT revisions_to_tank FOREIGN KEY (workshop_id, tank_id) REFERENCES tanks (workshop_id, id),
    CONSTRAINT revisions_to_member FOREIGN KEY (workshop_id, issued_by)
      REFERENCES memberships (workshop_id, user_id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS strapping_rows (
    revision_id CHAR(36) NOT NULL,
    row_no INT NOT NULL,
    depth_mm DOUBLE NOT NULL,
    volume_l DOUBLE NOT NULL,
    surface_cm2 DOUBLE NOT NULL,
    plus_minus_l DOUBLE NOT NULL,
    PRIMARY KEY (revision_id, row_no),
    CONSTRAINT strapping_rows_to_revision FOREIGN KEY (revision_id) REFERENCES revisions (id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS handovers (
    tank_id CHAR(36) NOT NULL,
    user_id CHAR(36) NOT NULL,
    workshop_id CHAR(36) NOT NULL,
    handed_over_by CHAR(36) NOT NULL,
    handed_over_at DATETIME(3) NOT NULL,
    PRIMARY KEY (tank_id, user_id),
    KEY handovers_owner (workshop_id, user_id),
    CONSTRAINT handovers_to_tank FOREIGN KEY (workshop_id, tank_id) REFERENCES tanks (workshop_id, id),
    CONSTRAINT handovers_to_owner FOREIGN KEY (workshop_id, user_id)
      REFERENCES memberships (workshop_id, user_id),
    CONSTRAINT handovers_to_giver FOREIGN KEY (workshop_id, handed_over_by)
      REFERENCES memberships (workshop_id, user_id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS readings (
    id CHAR(36) NOT NULL PRIMARY KEY,
    workshop_id CHAR(36) NOT NULL,
    tank_id CHAR(36) NOT NULL,
    revision_id CHAR(36) NOT NULL,
    idempotency_key VARCHAR(200) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
    body_hash CHAR(64) NOT NULL,
    taken_at DATETIME(3) NOT NULL,
    depth_mm DOUBLE NOT NULL,
    volume_l DOUBLE NOT NULL,
    usable_l DOUBLE NOT NULL,
    room_l DOUBLE NOT NULL,
    mass_kg DOUBLE NOT NULL,
    plus_minus_l DOUBLE NOT NULL,
    note VARCHAR(500) NULL,
    recorded_by CHAR(36) NOT NULL,
    recorded_at DATETIME(3) NOT NULL,
    UNIQUE KEY readings_key (tank_id, idempotency_key),
    KEY readings_time (workshop_id, tank_id, taken_at),
    CONSTRAINT readings_to_revision FOREIGN KEY (workshop_id, tank_id, revision_id)
      REFERENCES revisions (workshop_id, tank_id, id),
    CONSTRAINT readings_to_member FOREIGN KEY (workshop_id, recorded_by)
      REFERENCES memberships (workshop_id, user_id)
  ) ${table}`,

  `CREATE TABLE IF NOT EXISTS applied_seeds (
    name VARCHAR(64) NOT NULL PRIMARY KEY,
    applied_at DATETIME(3) NOT NULL
  ) ${table}`,
];

export async function up({ context }: { context: Sequelize }): Promise<void> {
  for (const statement of statements) await context.query(statement);
}
