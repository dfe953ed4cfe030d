import 'server-only'
import { Op, type Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { Conflict, NotFound } from '@/lib/errors'
import type { NewSheet, SheetRevision } from '@/lib/schemas/job'
import { CutSheet } from '@/models'
import { record } from './audit'
import { computeSheet } from './compute-sheet'
import { holdJob, writableBy } from './job-book'
import { inTransaction } from './transaction'

/** Which sheet of the job, and which revision of it. */
export interface SheetPlace {
  sheet: number
  revision: number
}

type Kept = Awaited<ReturnType<typeof computeSheet>>

/**
 * Saves a new sheet in a job as its revision 1; the sheet takes the job's next number.
 * @throws NotFound
 * @throws Unfit when the calculator refuses the field measure.
 */
export async function saveCutSheet(actor: Actor, jobId: string, asked: NewSheet): Promise<SheetPlace> {
  writableBy(actor)
  const kept = await computeSheet(asked)
  return inTransaction(async (transaction) => {
    await holdJob(actor, jobId, transaction)
    const last = await CutSheet.max<number | null, CutSheet>('sheet', { where: { jobId }, transaction })
    const place = { sheet: (last ?? 0) + 1, revision: 1 }
    await insert(actor, { ...asked, ...kept }, { jobId, ...place }, transaction)
    return place
  })
}

/**
 * Replaces a sheet's current revision by the next one; the older row stays and is marked superseded in the same commit.
 * @throws NotFound
 * @throws Unfit when the calculator refuses the field measure.
 * @throws Conflict with the current revision, when `revises` is no longer it.
 */
export async function reviseCutSheet(
  actor: Actor,
  jobId: string,
  sheet: number,
  asked: SheetRevision,
): Promise<SheetPlace> {
  writableBy(actor)
  const kept = await computeSheet(asked)
  return inTransaction(async (transaction) => {
    await holdJob(actor, jobId, transaction)
    const where = { jobId, sheet, supersededAt: { [Op.is]: null } }
    const current = await CutSheet.findOne({ where, attributes: ['revision'], transaction, raw: true })
    if (!current) throw new NotFound()
    if (current.revision !== asked.revises)
      throw new Conflict('This sheet was revised since you opened it. What you typed is still here.', current.revision)
    await CutSheet.update({ supersededAt: new Date() }, { where, transaction })
    const place = { sheet, revision: current.revision + 1 }
    await insert(actor, { ...asked, ...kept }, { jobId, ...place }, transaction)
    return place
  })
}

async function insert(
  actor: Actor,
  asked: NewSheet & Kept,
  place: SheetPlace & { jobId: string },
  transaction: Transaction,
) {
  const { name, calculator, calculatorRevision, inputs, results, measuredBy, measuredOn, instrument, note } = asked
  const { shopId, userId } = actor
  const head = { name, measuredBy, measuredOn, instrument, note, createdBy: userId }
  const numbers = { calculator, calculatorRevision, inputs, results }
  const { id } = await CutSheet.create({ ...place, ...head, ...numbers }, { transaction })
  const action = place.revision === 1 ? 'sheet.saved' : 'sheet.revised'
  await record({ shopId, userId, action, subjectId: id, details: { ...place } }, transaction)
}
