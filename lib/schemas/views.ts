import type { Preferences, Role } from './account'

/** What a screen is given: plain, dates as ISO text in UTC. Made by `lib/data`, sent by the API alike. */
export interface Me {
  name: string
  role: Role
  preferences: Preferences
}

export interface Account extends Me {
  email: string
  shop: string
  signIns: { id: string; startedAt: string; lastSeenAt: string; agent: string; thisOne: boolean }[]
}

export interface JobLine {
  id: string
  name: string
  place: string
  client: string
  sheets: number
  updatedAt: string
}

/** One page of a list; `next` is the cursor of the page after, or null. */
export interface Page<Line> {
  lines: Line[]
  next: string | null
}

export interface SheetLine {
  sheet: number
  name: string
  calculator: string
  /** Current revision. */
  revision: number
  measuredBy: string
  measuredOn: string
  createdAt: string
}

export interface JobView {
  id: string
  name: string
  place: string
  client: string
  notes: string
  version: number
  archivedAt: string | null
  updatedAt: string
  /** May this reader change it? */
  writable: boolean
  sheets: SheetLine[]
}

export interface RevisionLine {
  revision: number
  note: string
  measuredBy: string
  measuredOn: string
  createdBy: string
  createdAt: string
  supersededAt: string | null
}

export interface SheetView extends RevisionLine {
  jobId: string
  jobName: string
  place: string
  client: string
  sheet: number
  name: string
  calculator: string
  calculatorRevision: number
  instrument: string
  /** As understood, in the contract's units. */
  inputs: { [name: string]: unknown }
  /** The calculator's whole answer of the day it was saved: `outputs`, `text`, `steps`, `warnings`, `sources`. */
  results: SheetAnswer
  /** Number of the current revision; equal to `revision` unless this one is superseded. */
  currentRevision: number
  /** May this reader revise it? */
  writable: boolean
}

export interface SheetAnswer {
  id: string
  revision: number
  inputs: { [name: string]: unknown }
  outputs: { [name: string]: unknown }
  text: { [name: string]: unknown }
  steps: unknown[]
  warnings: unknown[]
  sources: readonly unknown[]
}

/** RFC 9457, as every refusal of the API is sent (`application/problem+json`). */
export interface Problem {
  type: string
  title: string
  status: number
  detail?: string
  /** One a wrong field. */
  errors?: { field: string; message: string }[]
  /** Under this number the log has more. */
  id?: string
}
