/** A kept sheet as it was opened to be revised: its job, its number there, and the revision that was read. */
export interface OpenedSheet {
  job: string
  sheet: number
  revision: number
}

/** Where a measure is to be kept: a job, or a sheet of it as its next revision. */
export type SheetPlace = OpenedSheet | { job: string; sheet?: undefined }

/** The part of an address that opens a page for revising a kept sheet. */
export const revisingQuery = ({ job, sheet, revision }: OpenedSheet): string =>
  new URLSearchParams({ job, sheet: String(sheet), revision: String(revision) }).toString()

const counted = (text: string | null) => (text !== null && /^[1-9]\d{0,3}$/.test(text) ? Number(text) : undefined)

/** What an address says of the job that a page was opened for: the job alone, or with the sheet being revised. */
export function readPlace(search: string): SheetPlace | null {
  const asked = new URLSearchParams(search)
  const [job, sheet, revision] = [asked.get('job'), counted(asked.get('sheet')), counted(asked.get('revision'))]
  if (!job) return null
  return sheet === undefined || revision === undefined ? { job } : { job, sheet, revision }
}
