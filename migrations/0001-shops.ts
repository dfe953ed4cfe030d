import { id, type Migration } from './migration'

/** A school, a local, an employer. */
export const shops: Migration = {
  name: '0001-shops',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS shops (
      id ${id} NOT NULL PRIMARY KEY,
      name VARCHAR(80) NOT NULL,
      createdAt DATETIME(3) NOT NULL,
      updatedAt DATETIME(3) NOT NULL
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS shops'),
}
