import { CutSheet, Job } from '@/models'
import type { Person } from './people'

/** A job of this person's. */
export async function newJob(owner: Person, name = 'A job'): Promise<string> {
  const { shopId, id: ownerId } = owner
  const { id } = await Job.create({ shopId, ownerId, name, place: '', client: '', notes: '', version: 1 })
  return id
}

/** A cut sheet's row as a save leaves it; its numbers are stand-ins for tests that do not look at them. */
export async function newSheet(owner: Person, jobId: string, sheet = 1): Promise<void> {
  const results = { id: 'miter', revision: 1, inputs: {}, outputs: {}, text: {}, steps: [], warnings: [], sources: [] }
  const numbers = { calculator: 'miter', calculatorRevision: 1, inputs: {}, results }
  const head = { name: 'A sheet', measuredBy: 'A hand', measuredOn: '2026-03-31', instrument: '', note: '' }
  await CutSheet.create({ jobId, sheet, revision: 1, ...head, ...numbers, createdBy: owner.id })
}

/** The form of a sheet whose bend is 34 degrees. */
export const sheetForm = {
  name: 'Porch rail',
  calculator: 'miter',
  inputs: { slopeBelow: 0, slopeAbove: 34 },
  measuredBy: 'R. Solberg',
  measuredOn: '2026-03-31',
  instrument: 'Tape',
}
