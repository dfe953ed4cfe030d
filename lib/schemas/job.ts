import { z } from './zod'
import { dayField, idField, optionalText, typedText, versionField } from './text'

/** Form and body of a new job. */
export const jobSchema = z.object({
  name: typedText('The job’s name', 120),
  place: optionalText('The place', 200).default(''),
  client: optionalText('The client', 120).default(''),
  notes: optionalText('The notes', 4000).default(''),
})

/** Form and body of a changed job: only the named fields change; `version` is the one that was read. */
export const jobChangeSchema = z.object({
  name: typedText('The job’s name', 120).optional(),
  place: optionalText('The place', 200).optional(),
  client: optionalText('The client', 120).optional(),
  notes: optionalText('The notes', 4000).optional(),
  /** Puts the job away, or takes it out again. */
  archived: z.boolean().optional(),
  version: versionField,
})

/** Which version of a job is put away. */
export const archiveSchema = z.object({ version: versionField })

/** What stands at the head of every cut sheet beside the numbers. */
const sheetHead = {
  name: typedText('The sheet’s name', 80),
  measuredBy: typedText('Measured by', 80),
  measuredOn: dayField,
  instrument: optionalText('The instrument', 120).default(''),
}

const sheetNumbers = {
  calculator: z
    .string({ error: 'Name the calculator.' })
    .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, { message: 'Name the calculator.' })
    .max(60),
  inputs: z.record(z.string(), z.unknown(), { error: 'The field measure is missing.' }),
  precision: z.object({ tape: z.number().optional(), dial: z.number().optional() }).optional(),
}

/** Form and body of a first revision. */
export const sheetSchema = z.object({
  ...sheetHead,
  ...sheetNumbers,
  note: optionalText('The note', 500).default(''),
})

/** Form and body of the next revision. `revises` is the revision that was read and is now replaced. */
export const sheetRevisionSchema = z.object({
  ...sheetHead,
  ...sheetNumbers,
  note: typedText('What changed', 500),
  revises: z.int({ error: 'Say which revision is replaced.' }).min(1),
})

/** Place of a job in the address. */
export const jobParams = z.object({ id: idField })

/** Place of a sheet in the address: its number in the job, from 1. */
export const sheetParams = z.object({ id: idField, sheet: z.coerce.number().int().min(1).max(9999) })

const revisionNumber = z.coerce.number().int().min(1).max(9999)

/** Which revision is read; left out, the current one. */
export const revisionQuery = z.object({ revision: revisionNumber.optional() })

/** Which two revisions stand beside each other. */
export const comparedRevisions = z.object({ was: revisionNumber, is: revisionNumber })

/** Where the next page of a list begins, as the page before gave it, and whether put-away jobs are listed. */
export const jobsQuery = z.object({
  cursor: z.string().max(200).optional(),
  archived: z.enum(['yes', 'no']).default('no'),
})

export type JobForm = z.input<typeof jobSchema>
export type NewJob = z.output<typeof jobSchema>
export type JobChange = z.output<typeof jobChangeSchema>
export type SheetForm = z.input<typeof sheetSchema>
export type NewSheet = z.output<typeof sheetSchema>
export type SheetRevisionForm = z.input<typeof sheetRevisionSchema>
export type SheetRevision = z.output<typeof sheetRevisionSchema>
