import { id, type Migration } from './migration'

/** Cut sheets, one row a revision. A job with sheets is not deleted. */
export const cutSheets: Migration = {
  name: '0007-cut-sheets',
  up: (run) =>
    run(`CREATE TABLE IF NOT EXISTS cut_sheets (
      id ${id} NOT NULL PRIMARY KEY,
      jobId ${id} NOT NULL,
      sheet INT NOT NULL,
      revision INT NOT NULL,
      name VARCHAR(80) NOT NULL,
      calculator VARCHAR(60) NOT NULL,
      calculatorRevision INT NOT NULL,
      inputs JSON NOT NULL,
      results JSON NOT NULL,
      measuredBy VARCHAR(80) NOT NULL,
      measuredOn DATE NOT NULL,
      instrument VARCHAR(120) NOT NULL DEFAULT '',
      note VARCHAR(500) NOT NULL DEFAULT '',
      createdBy ${id} NOT NULL,
      createdAt DATETIME(3) NOT NULL,
      supersededAt DATETIME(3) NULL,
      UNIQUE KEY cut_sheets_revision (jobId, sheet, revision),
      KEY cut_sheets_author (createdBy),
      CONSTRAINT cut_sheets_job FOREIGN KEY (jobId) REFERENCES jobs (id) ON DELETE RESTRICT,
      CONSTRAINT cut_sheets_author FOREIGN KEY (createdBy) REFERENCES users (id) ON DELETE RESTRICT
    ) ENGINE = InnoDB DEFAULT CHARSET = utf8mb4 COLLATE = utf8mb4_unicode_ci`),
  down: (run) => run('DROP TABLE IF EXISTS cut_sheets'),
}
