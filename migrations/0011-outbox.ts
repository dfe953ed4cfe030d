import { id, type Migration } from './migration'

/** Letters on their way. A worker takes the due ones that are neither sent nor given up. */
export const outbox: Migration = {
  name: '0011-outbox',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS outbox (
      id ${id} NOT NULL PRIMARY KEY,
      kind VARCHAR(40) NOT NULL,
      recipient VARCHAR(254) NOT NULL,
      payload JSON NOT NULL,
      attempts INT NOT NULL DEFAULT 0,
      dueAt DATETIME(3) NOT NULL,
      sentAt DATETIME(3) NULL,
      givenUpAt DATETIME(3) NULL,
      createdAt DATETIME(3) NOT NULL,
      KEY outbox_due (sentAt, givenUpAt, dueAt)
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS outbox'),
}
