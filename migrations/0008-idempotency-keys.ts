import type { Migration } from './migration'

/** Answers of creating calls, kept a day. */
export const idempotencyKeys: Migration = {
  name: '0008-idempotency-keys',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS idempotency_keys (
      owner VARCHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      \`key\` VARCHAR(100) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      requestHash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      status INT NOT NULL,
      answer JSON NULL,
      createdAt DATETIME(3) NOT NULL,
      PRIMARY KEY (owner, \`key\`),
      KEY idempotency_keys_age (createdAt)
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS idempotency_keys'),
}
