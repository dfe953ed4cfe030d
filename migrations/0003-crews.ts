import { id, type Migration } from './migration'

/** Crews of a shop. */
export const crews: Migration = {
  name: '0003-crews',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS crews (
      id ${id} NOT NULL PRIMARY KEY,
      shopId ${id} NOT NULL,
      name VARCHAR(80) NOT NULL,
      createdAt DATETIME(3) NOT NULL,
      updatedAt DATETIME(3) NOT NULL,
      UNIQUE KEY crews_name (shopId, name),
      CONSTRAINT crews_shop FOREIGN KEY (shopId) REFERENCES shops (id) ON DELETE RESTRICT
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS crews'),
}
