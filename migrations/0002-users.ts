import { id, type Migration } from './migration'

/** People who sign in. A shop with people is not deleted; e-mail addresses are unique over all shops, as sign-in asks for no shop. */
export const users: Migration = {
  name: '0002-users',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS users (
      id ${id} NOT NULL PRIMARY KEY,
      shopId ${id} NOT NULL,
      name VARCHAR(80) NOT NULL,
      email VARCHAR(254) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      passwordHash VARCHAR(255) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      role ENUM('apprentice', 'journeyman', 'instructor', 'coordinator') NOT NULL,
      disabledAt DATETIME(3) NULL,
      demo BOOLEAN NOT NULL DEFAULT FALSE,
      units ENUM('in', 'mm') NOT NULL DEFAULT 'in',
      tape SMALLINT NOT NULL DEFAULT 16,
      sawSquare SMALLINT NOT NULL DEFAULT 0,
      dialStep DECIMAL(3, 2) NOT NULL DEFAULT 0.25,
      theme ENUM('system', 'paper', 'sun', 'night') NOT NULL DEFAULT 'system',
      version INT NOT NULL DEFAULT 1,
      createdAt DATETIME(3) NOT NULL,
      updatedAt DATETIME(3) NOT NULL,
      UNIQUE KEY users_email (email),
      KEY users_shop (shopId),
      KEY users_demo (demo),
      CONSTRAINT users_shop FOREIGN KEY (shopId) REFERENCES shops (id) ON DELETE RESTRICT
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS users'),
}
