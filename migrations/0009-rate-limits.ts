import type { Migration } from './migration'

/** Counters of tries, shared by all processes. The columns are those of rate-limiter-flexible. */
export const rateLimits: Migration = {
  name: '0009-rate-limits',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS rate_limits (
      \`key\` VARCHAR(255) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      points INT NOT NULL DEFAULT 0,
      expire BIGINT UNSIGNED NULL,
      KEY rate_limits_age (expire)
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS rate_limits'),
}
