import type { MigrationStep } from '../migrator';

export const up: MigrationStep = async (queryInterface, transaction) => {
  const run = (sql: string) => queryInterface.sequelize.query(sql, { transaction });
  await run(
    `CREATE TABLE chains (
      id UUID NOT NULL PRIMARY KEY,
      project_id UUID NOT NULL REFERENCES projects (id) ON DELETE RESTRICT,
      name VARCHAR(120) NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
      specification JSON NOT NULL CHECK (json_valid(specification)),
      version INTEGER NOT NULL DEFAULT 1,
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL
    )`,
  );
  await run('CREATE INDEX chains_project ON chains (project_id, name)');
  await run(
    `CREATE TABLE options (
      id UUID NOT NULL PRIMARY KEY,
      chain_id UUID NOT NULL REFERENCES chains (id) ON DELETE CASCADE,
      name VARCHAR(120) NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
      position INTEGER NOT NULL,
      version INTEGER NOT NULL DEFAULT 1,
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL
    )`,
  );
  await run('CREATE INDEX options_chain ON options (chain_id, position)');
  // Stage ids are made by clients: they only need to be unique in their option.
  await run(
    `CREATE TABLE stages (
      option_id UUID NOT NULL REFERENCES options (id) ON DELETE CASCADE,
      id UUID NOT NULL,
      position INTEGER NOT NULL CHECK (position BETWEEN 0 AND 23),
      kind VARCHAR(20) NOT NULL
        CHECK (kind IN ('voltage-feedback', 'current-feedback', 'rc-section', 'matched-block')),
      name VARCHAR(120) NOT NULL,
      device_id UUID REFERENCES devices (id) ON DELETE RESTRICT,
      parameters JSON NOT NULL CHECK (json_valid(parameters)),
      PRIMARY KEY (option_id, id),
      UNIQUE (option_id, position)
    )`,
  );
  await run('CREATE INDEX stages_device ON stages (device_id)');
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('stages', { transaction });
  await queryInterface.dropTable('options', { transaction });
  await queryInterface.dropTable('chains', { transaction });
};
