import type { MigrationStep } from '../migrator';

export const up: MigrationStep = async (queryInterface, transaction) => {
  const run = (sql: string) => queryInterface.sequelize.query(sql, { transaction });
  await run(
    `CREATE TABLE quotes (
      id UUID NOT NULL PRIMARY KEY,
      device_id UUID NOT NULL UNIQUE REFERENCES devices (id) ON DELETE CASCADE,
      currency CHAR(3) NOT NULL CHECK (length(currency) = 3),
      reference VARCHAR(120),
      valid_until DATE,
      supplier VARCHAR(120),
      entered_by_id UUID NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      version INTEGER NOT NULL DEFAULT 1,
      created_at DATETIME NOT NULL,
      updated_at DATETIME NOT NULL
    )`,
  );
  await run(
    `CREATE TABLE quote_breaks (
      quote_id UUID NOT NULL REFERENCES quotes (id) ON DELETE CASCADE,
      quantity INTEGER NOT NULL CHECK (quantity >= 1),
      unit_price_micros INTEGER NOT NULL CHECK (unit_price_micros > 0),
      PRIMARY KEY (quote_id, quantity)
    )`,
  );
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('quote_breaks', { transaction });
  await queryInterface.dropTable('quotes', { transaction });
};
