import { preferencesSchema, roles } from './account'
import { z } from './zod'

/** What screens are given and the API sends: plain, with instants as ISO text in UTC. Made by `lib/data`. */
const instant = z.iso.datetime()
const day = z.iso.date()
const named = z.record(z.string(), z.unknown())

export const meSchema = z.object({ name: z.string(), role: z.enum(roles), preferences: preferencesSchema })
export type Me = z.output<typeof meSchema>

export const accountSchema = meSchema.extend({
  email: z.string(),
  shop: z.string(),
  signIns: z.array(
    z.object({ id: z.uuid(), startedAt: instant, lastSeenAt: instant, agent: z.string(), thisOne: z.boolean() }),
  ),
})
export type Account = z.output<typeof accountSchema>

const jobHead = { id: z.uuid(), name: z.string(), place: z.string(), client: z.string(), updatedAt: instant }

const jobLineSchema = z.object({ ...jobHead, sheets: z.int().describe('How many cut sheets it has') })
export type JobLine = z.output<typeof jobLineSchema>

export const jobsPageSchema = z.object({
  lines: z.array(jobLineSchema),
  next: z.string().nullable().describe('The cursor of the page after, or null'),
})

/** One page of a list; `next` is the cursor of the page after, or null. */
export interface Page<Line> {
  lines: Line[]
  next: string | null
}

const sheetLineSchema = z.object({
  sheet: z.int(),
  name: z.string(),
  calculator: z.string(),
  revision: z.int().describe('The current one'),
  measuredBy: z.string(),
  measuredOn: day,
  createdAt: instant,
})
export type SheetLine = z.output<typeof sheetLineSchema>

export const jobViewSchema = z.object({
  ...jobHead,
  notes: z.string(),
  version: z.int(),
  archivedAt: instant.nullable(),
  writable: z.boolean().describe('May this reader change it?'),
  sheets: z.array(sheetLineSchema),
})
export type JobView = z.output<typeof jobViewSchema>

export const revisionLineSchema = z.object({
  revision: z.int(),
  note: z.string().describe('What changed'),
  measuredBy: z.string(),
  measuredOn: day,
  createdBy: z.string(),
  createdAt: instant,
  supersededAt: instant.nullable(),
})
export type RevisionLine = z.output<typeof revisionLineSchema>

const sheetAnswerSchema = z.object({
  id: z.string(),
  revision: z.int(),
  inputs: named,
  outputs: named,
  text: named,
  steps: z.array(z.unknown()),
  warnings: z.array(z.unknown()),
  sources: z.array(z.unknown()).readonly(),
})
export type SheetAnswer = z.output<typeof sheetAnswerSchema>

export const sheetViewSchema = revisionLineSchema.extend({
  jobId: z.uuid(),
  jobName: z.string(),
  place: z.string(),
  client: z.string(),
  sheet: z.int(),
  name: z.string(),
  calculator: z.string(),
  calculatorRevision: z.int(),
  instrument: z.string(),
  inputs: named.describe('As understood, in inches and degrees'),
  results: sheetAnswerSchema.describe('The calculator’s whole answer of the day it was saved'),
  currentRevision: z.int().describe('Equal to `revision` unless this one is superseded'),
  writable: z.boolean().describe('May this reader revise it?'),
})
export type SheetView = z.output<typeof sheetViewSchema>

/** RFC 9457, as every refusal of the API is sent (`application/problem+json`). */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  errors: z
    .array(z.object({ field: z.string(), message: z.string() }))
    .optional()
    .describe('One a wrong field'),
  id: z.string().optional().describe('Under this number the log has more'),
  current: z.int().optional().describe('The version that stands, after a conflict'),
})
export type Problem = z.output<typeof problemSchema>
