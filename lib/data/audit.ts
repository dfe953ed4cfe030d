import 'server-only'
import type { Transaction } from 'sequelize'
import { AuditEvent } from '@/models'

type Action =
  | 'shop.opened'
  | 'job.created'
  | 'job.changed'
  | 'sheet.saved'
  | 'sheet.revised'
  | 'password.changed'
  | 'sign-ins.ended'

interface Deed {
  shopId: string
  /** Whose doing it was. */
  userId: string
  action: Action
  subjectId: string
  details?: { [name: string]: unknown }
}

/** Writes who did what, in the transaction that does it. */
export async function record({ userId, details = {}, ...deed }: Deed, transaction: Transaction): Promise<void> {
  await AuditEvent.create({ ...deed, actorId: userId, details, at: new Date() }, { transaction })
}
