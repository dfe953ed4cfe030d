import 'server-only'
import { AsyncLocalStorage } from 'node:async_hooks'
import { BaseError, Transaction } from 'sequelize'
import { sequelize } from '@/models'

const underWay = new AsyncLocalStorage<Transaction>()
const triesAtMost = 4

/**
 * Runs `work` in one transaction; inside another one it joins that one, so that a creating call and the answer kept
 * for its repeat commit together. READ COMMITTED, because a refused save must read what stands now.
 * A deadlock's loser is rolled back whole and runs again.
 */
export async function inTransaction<Result>(work: (transaction: Transaction) => Promise<Result>): Promise<Result> {
  const outer = underWay.getStore()
  if (outer) return work(outer)
  for (let tried = 1; ; tried++) {
    try {
      return await sequelize.transaction({ isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED }, (own) =>
        underWay.run(own, () => work(own)),
      )
    } catch (error) {
      if (tried === triesAtMost || !isDeadlock(error)) throw error
    }
  }
}

function isDeadlock(error: unknown): boolean {
  if (!(error instanceof BaseError) || !('parent' in error)) return false
  const { parent } = error
  return typeof parent === 'object' && parent !== null && 'errno' in parent && parent.errno === 1213
}
