import { id, type Migration } from './migration'

/** Who did what. Nobody and nothing in it can be deleted while it stands. */
export const auditEvents: Migration = {
  name: '0010-audit-events',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS audit_events (
      id ${id} NOT NULL PRIMARY KEY,
      shopId ${id} NOT NULL,
      actorId ${id} NOT NULL,
      action VARCHAR(60) NOT NULL,
      subjectId ${id} NOT NULL,
      details JSON NOT NULL,
      at DATETIME(3) NOT NULL,
      KEY audit_events_shop (shopId, id),
      KEY audit_events_actor (actorId),
      CONSTRAINT audit_events_shop FOREIGN KEY (shopId) REFERENCES shops (id) ON DELETE RESTRICT,
      CONSTRAINT audit_events_actor FOREIGN KEY (actorId) REFERENCES users (id) ON DELETE RESTRICT
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS audit_events'),
}
