import 'server-only'
import { literal, Op } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { Conflict, NotFound } from '@/lib/errors'
import type { JobChange, NewJob } from '@/lib/schemas/job'
import type { JobLine, JobView, Page } from '@/lib/schemas/views'
import { Job } from '@/models'
import { record } from './audit'
import { after, cursorOf } from './cursor'
import { idOf, mayWrite, visibleTo, writableBy } from './job-book'
import { currentSheets } from './sheet-lines'
import { inTransaction } from './transaction'

const pageSize = 50

interface Asked {
  cursor?: string | undefined
  archived?: 'yes' | 'no'
}

/** Jobs of the actor's shop, last changed first, a page at a time; either those in hand or those put away. */
export async function listJobs(actor: Actor, { cursor, archived = 'no' }: Asked = {}): Promise<Page<JobLine>> {
  const rows = await Job.findAll({
    where: { [Op.and]: [{ ...visibleTo(actor), archived: archived === 'yes' }, after(cursor)] },
    attributes: ['id', 'name', 'place', 'client', 'updatedAt', sheetsOfJob],
    order: [
      ['updatedAt', 'DESC'],
      ['id', 'DESC'],
    ],
    limit: pageSize + 1,
    raw: true,
  })
  const lines = rows.slice(0, pageSize)
  const last = rows.length > pageSize ? lines.at(-1) : undefined
  return { lines: lines.map(lineOf), next: last ? cursorOf(last) : null }
}

// Sheets are numbered from 1 and never deleted, so the greatest number is their count, read off the index.
const sheetsOfJob: [ReturnType<typeof literal>, string] = [
  literal('(SELECT COALESCE(MAX(c.sheet), 0) FROM cut_sheets c WHERE c.jobId = Job.id)'),
  'sheets',
]

function lineOf(row: Job): JobLine {
  const { id, name, place, client, updatedAt } = row
  const sheets = 'sheets' in row ? Number(row.sheets) : 0
  return { id, name, place, client, sheets, updatedAt: updatedAt.toISOString() }
}

/** One job with the current revisions of its sheets. @throws NotFound */
export async function getJob(actor: Actor, jobId: string): Promise<JobView> {
  const job = await Job.findOne({
    where: { ...visibleTo(actor), id: idOf(jobId) },
    attributes: ['id', 'name', 'place', 'client', 'notes', 'version', 'archivedAt', 'updatedAt'],
    raw: true,
  })
  if (!job) throw new NotFound()
  const { archivedAt, updatedAt, ...plain } = job
  return {
    ...plain,
    archivedAt: archivedAt?.toISOString() ?? null,
    updatedAt: updatedAt.toISOString(),
    writable: mayWrite(actor),
    sheets: await currentSheets(job.id),
  }
}

const by = ({ shopId, userId }: Actor) => ({ shopId, userId })

/** Opens a job in the actor's shop. */
export async function createJob(
  actor: Actor,
  { name, place, client, notes }: NewJob,
): Promise<{ id: string; version: number }> {
  writableBy(actor)
  return inTransaction(async (transaction) => {
    const job = { shopId: actor.shopId, ownerId: actor.userId, name, place, client, notes, version: 1 }
    const { id } = await Job.create(job, { transaction })
    await record({ ...by(actor), action: 'job.created', subjectId: id }, transaction)
    return { id, version: 1 }
  })
}

/**
 * Changes the named fields; `archived` puts the job away or takes it out again. Gives the new version.
 * @throws NotFound
 * @throws Conflict with the version that stands, when somebody saved since `version` was read.
 */
export async function changeJob(actor: Actor, jobId: string, change: JobChange): Promise<{ version: number }> {
  const { version, archived, ...fields } = change
  const where = { ...writableBy(actor), id: idOf(jobId) }
  const state = archived === undefined ? {} : { archivedAt: archived ? new Date() : null }
  return inTransaction(async (transaction) => {
    const next = version + 1
    const values = { ...fields, ...state, version: next }
    const [changed] = await Job.update(values, { where: { ...where, version }, transaction })
    if (changed === 0) {
      const job = await Job.findOne({ where, attributes: ['version'], transaction, raw: true })
      if (!job) throw new NotFound()
      throw new Conflict('This job was saved elsewhere since you opened it. What you typed is still here.', job.version)
    }
    await record({ ...by(actor), action: 'job.changed', subjectId: jobId, details: { ...change } }, transaction)
    return { version: next }
  })
}
