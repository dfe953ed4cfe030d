import 'server-only'
import { createHmac } from 'node:crypto'
import { UniqueConstraintError } from 'sequelize'
import { config } from '@/lib/config'
import { Unfit } from '@/lib/errors'
import { IdempotencyKey } from '@/models'
import { inTransaction } from './transaction'

export interface Call {
  /** The user's id, or `anyone`. */
  owner: string
  /** The caller's own key, the same for a repeat. */
  key: string
  /** What is asked, and where: a repeat is the same to the letter. */
  asked: string
}

export interface Answer {
  status: number
  answer: object | null
}

/**
 * Does `work` once for a key, however often and however close together the call comes; a repeat gets the first answer.
 * The key's row, the work and the answer commit together, so a process that dies half-way leaves nothing behind, and a
 * call that comes while the first is under way waits on its row.
 * @throws Unfit when the key was used for another request.
 */
export async function once(call: Call, status: number, work: () => Promise<object>): Promise<Answer> {
  const requestHash = hashOf(call.asked)
  const { owner, key } = call
  try {
    return await inTransaction(async (transaction) => {
      await IdempotencyKey.create({ owner, key, requestHash, status, answer: null }, { transaction })
      const answer = await work()
      await IdempotencyKey.update({ answer }, { where: { owner, key }, transaction })
      return { status, answer }
    })
  } catch (error) {
    const earlier = error instanceof UniqueConstraintError ? await answerGiven(call, requestHash) : null
    if (earlier === null) throw error
    return earlier
  }
}

// Keyed, as a body may hold a password: the bare hash of one could be guessed at from a stolen table.
function hashOf(asked: string): string {
  return createHmac('sha256', config().AUTH_SECRET).update(asked).digest('hex')
}

async function answerGiven({ owner, key }: Call, requestHash: string): Promise<Answer | null> {
  const row = await IdempotencyKey.findOne({
    where: { owner, key },
    attributes: ['requestHash', 'status', 'answer'],
    raw: true,
  })
  if (row === null) return null
  if (row.requestHash !== requestHash)
    throw new Unfit([{ field: 'Idempotency-Key', message: 'This key was used for another request: take a new one.' }])
  return { status: row.status, answer: row.answer }
}
