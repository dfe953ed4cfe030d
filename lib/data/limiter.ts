import 'server-only'
import { RateLimiterMySQL } from 'rate-limiter-flexible'
import { QueryTypes } from 'sequelize'
import { sequelize } from '@/models'

export interface Limit {
  name: string
  /** How many in the window. */
  points: number
  seconds: number
}

/**
 * The library's database limiter over our own pool. Its own statements want another connector's callbacks; one
 * statement that counts and answers at once does the same and needs no transaction.
 */
class DatabaseLimiter extends RateLimiterMySQL {
  constructor({ name, points, seconds }: Limit) {
    const store = { storeClient: sequelize, storeType: 'sequelize', tableName: 'rate_limits', tableCreated: true }
    // The library would sweep with a statement of its own, which our pool cannot read, and keep the connection.
    super({ ...store, keyPrefix: name, points, duration: seconds, clearExpiredByTimeout: false })
  }

  async _upsert(key: string, points: number, durationMs: number, overwrite = false) {
    const now = Date.now()
    const fresh = overwrite ? 'TRUE' : 'expire <= :now'
    return sequelize.query(
      `INSERT INTO rate_limits (\`key\`, points, expire) VALUES (:key, :points, :expire)
       ON DUPLICATE KEY UPDATE points = IF(${fresh}, :points, points + :points), expire = IF(${fresh}, :expire, expire)
       RETURNING points, expire`,
      { replacements: { key, points, now, expire: durationMs > 0 ? now + durationMs : null }, type: QueryTypes.SELECT },
    )
  }

  async _get(key: string) {
    const rows = await sequelize.query(
      'SELECT points, expire FROM rate_limits WHERE `key` = :key AND (expire > :now OR expire IS NULL)',
      { replacements: { key, now: Date.now() }, type: QueryTypes.SELECT },
    )
    return rows.length > 0 ? rows : null
  }

  async _delete(key: string) {
    await sequelize.query('DELETE FROM rate_limits WHERE `key` = :key', {
      replacements: { key },
      type: QueryTypes.DELETE,
    })
    return true
  }
}

/** A counter in the database: shared by every process, still there after a restart. */
export function limiterOf(limit: Limit): RateLimiterMySQL {
  return new DatabaseLimiter(limit)
}
