import 'server-only'
import type { InferAttributes, Transaction, WhereOptions } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { Denied, NotFound } from '@/lib/errors'
import { idField } from '@/lib/schemas/text'
import { Job } from '@/models'

const noJobBook = 'The job book is the journeyman’s: your sign-in has none.'

/**
 * The jobs this actor may see: a journeyman those of the own shop, and the coordinator too, who answers for the shop's
 * records. Apprentices and instructors work on pieces and have no job book.
 */
export function visibleTo(actor: Actor): WhereOptions<InferAttributes<Job>> {
  switch (actor.role) {
    case 'journeyman':
    case 'coordinator':
      return { shopId: actor.shopId }
    default:
      throw new Denied(noJobBook)
  }
}

/** The jobs this actor may change: those a journeyman sees. The coordinator reads only. */
export function writableBy(actor: Actor): WhereOptions<InferAttributes<Job>> {
  if (actor.role !== 'journeyman') throw new Denied('Jobs are changed by the shop’s journeymen.')
  return visibleTo(actor)
}

/** May this actor change the jobs it sees? */
export const mayWrite = (actor: Actor) => actor.role === 'journeyman'

/** An id as it came from an address. @throws NotFound when it is none, as for a missing row. */
export function idOf(text: string): string {
  const id = idField.safeParse(text)
  if (!id.success) throw new NotFound()
  return id.data
}

/** Locks a job for a change that hangs on it, and brings it to the top of the book. @throws NotFound */
export async function holdJob(actor: Actor, jobId: string, transaction: Transaction): Promise<void> {
  const where = { ...writableBy(actor), id: idOf(jobId) }
  const job = await Job.findOne({ where, attributes: ['id'], lock: transaction.LOCK.UPDATE, transaction, raw: true })
  if (!job) throw new NotFound()
  await Job.update({ updatedAt: new Date() }, { where, transaction })
}
