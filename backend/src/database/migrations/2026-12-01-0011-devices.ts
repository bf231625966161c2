import type { MigrationStep } from '../migrator';

/** Where a datasheet gives no minimum, the library filters and sorts by typical × 0.7 (common practice), never by typical. */
const GUARANTEED_GBW = `COALESCE(
  json_extract(parameters, '$.gainBandwidthHz.min'),
  0.7 * json_extract(parameters, '$.gainBandwidthHz.typ'))`;

export const up: MigrationStep = async (queryInterface, transaction) => {
  const run = (sql: string) => queryInterface.sequelize.query(sql, { transaction });
  await run(
    `CREATE TABLE devices (
      id UUID NOT NULL PRIMARY KEY,
      kind VARCHAR(20) NOT NULL CHECK (kind IN ('voltage-feedback', 'current-feedback', 'matched-block')),
      part_number VARCHAR(60) NOT NULL COLLATE NOCASE CHECK (length(part_number) BETWEEN 1 AND 60),
      maker VARCHAR(120) NOT NULL DEFAULT '' COLLATE NOCASE,
      grade VARCHAR(20) NOT NULL CHECK (grade IN ('general-purpose', 'rf')),
      package VARCHAR(120),
      lifecycle VARCHAR(20) CHECK (lifecycle IN ('active', 'not-recommended', 'last-time-buy', 'obsolete')),
      lifecycle_date DATE,
      channels INTEGER NOT NULL CHECK (channels >= 1),
      parameters JSON NOT NULL CHECK (json_valid(parameters)),
      datasheet_revision VARCHAR(120),
      datasheet_title VARCHAR(120),
      notes TEXT,
      entered_by_id UUID NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      values_edited_by_id UUID NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      verified_by_id UUID REFERENCES users (id) ON DELETE RESTRICT,
      verified_at DATETIME,
      version INTEGER NOT NULL DEFAULT 1,
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL,
      guaranteed_gbw_hz REAL GENERATED ALWAYS AS (${GUARANTEED_GBW}) VIRTUAL
    )`,
  );
  await run('CREATE UNIQUE INDEX devices_part_number ON devices (part_number, maker)');
  await run('CREATE INDEX devices_kind ON devices (kind, part_number)');
  await run('CREATE INDEX devices_guaranteed_gbw ON devices (guaranteed_gbw_hz)');
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('devices', { transaction });
};
