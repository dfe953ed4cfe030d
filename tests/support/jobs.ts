import { computeSheet } from '@/lib/data/compute-sheet'
import { CutSheet, Job } from '@/models'
import type { Person } from './people'

/** A job of this person's. */
export async function newJob(owner: Person, name = 'A job'): Promise<string> {
  const { shopId, id: ownerId } = owner
  const { id } = await Job.create({ shopId, ownerId, name, place: '', client: '', notes: '', version: 1 })
  return id
}

/** A cut sheet's row as a save leaves it. */
export async function newSheet(owner: Person, jobId: string, sheet = 1): Promise<void> {
  const { calculator, inputs, ...head } = sheetForm
  const numbers = await computeSheet({ calculator, inputs })
  await CutSheet.create({ jobId, sheet, revision: 1, ...head, note: '', ...numbers, createdBy: owner.id })
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
