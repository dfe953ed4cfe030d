/** Runs one statement. */
export type Run = (statement: string) => Promise<unknown>

/** One step of the schema: one statement each way, guarded, so that a step killed half-way can be run again. */
export interface Migration {
  name: string
  up: (run: Run) => Promise<unknown>
  down: (run: Run) => Promise<unknown>
}

/** The column type of every id, as `models/columns.ts` reads it. */
export const id = 'CHAR(36) CHARACTER SET ascii COLLATE ascii_bin'
