import type { MigrationStep } from '../migrator';

export const up: MigrationStep = async (queryInterface, transaction) => {
  const run = (sql: string) => queryInterface.sequelize.query(sql, { transaction });
  await run(
    `CREATE TABLE audit_events (
      id INTEGER PRIMARY KEY AUTOINCREMENT,
      at DATETIME NOT NULL,
      actor_id UUID REFERENCES users (id) ON DELETE RESTRICT,
      action VARCHAR(100) NOT NULL,
      entity VARCHAR(50) NOT NULL,
      entity_id VARCHAR(100) NOT NULL,
      before JSON CHECK (before IS NULL OR json_valid(before)),
      after JSON CHECK (after IS NULL OR json_valid(after)),
      request_id UUID
    )`,
  );
  await run('CREATE INDEX audit_events_entity ON audit_events (entity, entity_id, id)');
  await run('CREATE INDEX audit_events_actor ON audit_events (actor_id, id)');
  // The trail is only ever added to.
  await run(
    `CREATE TRIGGER audit_events_no_update BEFORE UPDATE ON audit_events
     BEGIN SELECT RAISE(ABORT, 'audit events are never changed'); END`,
  );
  await run(
    `CREATE TRIGGER audit_events_no_delete BEFORE DELETE ON audit_events
     BEGIN SELECT RAISE(ABORT, 'audit events are never deleted'); END`,
  );
};

export const down: MigrationStep = async (queryInterface, transaction) => {
  await queryInterface.dropTable('audit_events', { transaction });
};
