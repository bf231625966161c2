import type { MigrationStep } from '../migrator';

export const up: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.sequelize.query(
    `CREATE TABLE users (
      id UUID NOT NULL PRIMARY KEY,
      name VARCHAR(200) NOT NULL CHECK (length(name) BETWEEN 1 AND 200),
      email VARCHAR(254) NOT NULL COLLATE NOCASE UNIQUE,
      title VARCHAR(200),
      roles JSON NOT NULL CHECK (json_valid(roles)),
      active TINYINT(1) NOT NULL DEFAULT 1 CHECK (active IN (0, 1)),
      is_demo TINYINT(1) NOT NULL DEFAULT 0 CHECK (is_demo IN (0, 1)),
      password_hash TEXT,
      session_epoch INTEGER NOT NULL DEFAULT 0,
      version INTEGER NOT NULL DEFAULT 1,
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL
    )`,
    { transaction },
  );
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('users', { transaction });
};
