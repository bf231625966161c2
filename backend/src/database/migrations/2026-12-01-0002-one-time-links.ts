import type { MigrationStep } from '../migrator';

export const up: MigrationStep = async (queryInterface, transaction) => {
  const run = (sql: string) => queryInterface.sequelize.query(sql, { transaction });
  await run(
    `CREATE TABLE one_time_links (
      id UUID NOT NULL PRIMARY KEY,
      user_id UUID NOT NULL REFERENCES users (id) ON DELETE CASCADE,
      token_hash CHAR(64) NOT NULL UNIQUE,
      expires_at DATETIME NOT NULL,
      created_by_id UUID REFERENCES users (id) ON DELETE SET NULL,
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL
    )`,
  );
  await run('CREATE INDEX one_time_links_user ON one_time_links (user_id)');
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('one_time_links', { transaction });
};
