import { id, type Migration } from './migration'

/** The job book. A job outlives nobody silently: its shop and its owner cannot be deleted under it. */
export const jobs: Migration = {
  name: '0006-jobs',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS jobs (
      id ${id} NOT NULL PRIMARY KEY,
      shopId ${id} NOT NULL,
      ownerId ${id} NOT NULL,
      name VARCHAR(120) NOT NULL,
      place VARCHAR(200) NOT NULL DEFAULT '',
      client VARCHAR(120) NOT NULL DEFAULT '',
      notes TEXT NOT NULL,
      archivedAt DATETIME(3) NULL,
      archived BOOLEAN AS (archivedAt IS NOT NULL) PERSISTENT,
      version INT NOT NULL DEFAULT 1,
      createdAt DATETIME(3) NOT NULL,
      updatedAt DATETIME(3) NOT NULL,
      KEY jobs_list (shopId, archived, updatedAt, id),
      KEY jobs_owner (ownerId),
      CONSTRAINT jobs_shop FOREIGN KEY (shopId) REFERENCES shops (id) ON DELETE RESTRICT,
      CONSTRAINT jobs_owner FOREIGN KEY (ownerId) REFERENCES users (id) ON DELETE RESTRICT
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS jobs'),
}
