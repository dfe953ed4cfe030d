import { id, type Migration } from './migration'

/** A row a session. Sessions go with their person. */
export const signIns: Migration = {
  name: '0005-sign-ins',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS sign_ins (
      id ${id} NOT NULL PRIMARY KEY,
      userId ${id} NOT NULL,
      startedAt DATETIME(3) NOT NULL,
      lastSeenAt DATETIME(3) NOT NULL,
      endedAt DATETIME(3) NULL,
      agent VARCHAR(200) NOT NULL DEFAULT '',
      KEY sign_ins_user (userId, endedAt),
      CONSTRAINT sign_ins_user FOREIGN KEY (userId) REFERENCES users (id) ON DELETE CASCADE
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS sign_ins'),
}
