import type { MigrationStep } from '../migrator';

export const up: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.sequelize.query(
    `CREATE TABLE settings (
      key VARCHAR(100) NOT NULL PRIMARY KEY,
      value JSON NOT NULL CHECK (json_valid(value)),
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL
    )`,
    { transaction },
  );
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('settings', { transaction });
};
