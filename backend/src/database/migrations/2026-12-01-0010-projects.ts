import type { MigrationStep } from '../migrator';

export const up: MigrationStep = async (queryInterface, transaction) => {
  const run = (sql: string) => queryInterface.sequelize.query(sql, { transaction });
  await run(
    `CREATE TABLE projects (
      id UUID NOT NULL PRIMARY KEY,
      code VARCHAR(24) NOT NULL CHECK (length(code) BETWEEN 1 AND 24),
      name VARCHAR(120) NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
      description TEXT NOT NULL DEFAULT '',
      open TINYINT(1) NOT NULL CHECK (open IN (0, 1)),
      currency CHAR(3) NOT NULL CHECK (length(currency) = 3),
      build_quantity INTEGER NOT NULL CHECK (build_quantity >= 1),
      policy JSON NOT NULL CHECK (json_valid(policy)),
      version INTEGER NOT NULL DEFAULT 1,
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL
    )`,
  );
  await run(
    `CREATE TABLE project_members (
      project_id UUID NOT NULL REFERENCES projects (id) ON DELETE CASCADE,
      user_id UUID NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      PRIMARY KEY (project_id, user_id)
    )`,
  );
  await run('CREATE INDEX project_members_user ON project_members (user_id, project_id)');
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('project_members', { transaction });
  await queryInterface.dropTable('projects', { transaction });
};
