import 'server-only'
import type { Transaction } from 'sequelize'
import { OutboxLetter } from '@/models'

/** A letter and what it tells. Each kind has its own text where letters are written. */
interface Letter {
  kind: 'password-changed'
  /** E-mail address. */
  recipient: string
  payload: { [name: string]: unknown }
}

/** Puts a letter on its way, in the transaction that causes it: neither is kept without the other. */
export async function post(letter: Letter, transaction: Transaction): Promise<void> {
  await OutboxLetter.create({ ...letter, dueAt: new Date() }, { transaction })
}
