import { id, type Migration } from './migration'

/** Who stands in which crew. A place goes with its crew or its person. */
export const crewMembers: Migration = {
  name: '0004-crew-members',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS crew_members (
      crewId ${id} NOT NULL,
      userId ${id} NOT NULL,
      place ENUM('apprentice', 'instructor') NOT NULL,
      createdAt DATETIME(3) NOT NULL,
      PRIMARY KEY (crewId, userId),
      KEY crew_members_user (userId),
      CONSTRAINT crew_members_crew FOREIGN KEY (crewId) REFERENCES crews (id) ON DELETE CASCADE,
      CONSTRAINT crew_members_user FOREIGN KEY (userId) REFERENCES users (id) ON DELETE CASCADE
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS crew_members'),
}
