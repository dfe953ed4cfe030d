import 'server-only'
import { Op, QueryTypes } from 'sequelize'
import { IdempotencyKey, sequelize } from '@/models'

const answersKeptForMs = 24 * 3600_000

/** Forgets what has served its time: answers kept for repeats after a day, counters of tries once they have run out. */
export async function tidy(now: number = Date.now()): Promise<void> {
  await IdempotencyKey.destroy({ where: { createdAt: { [Op.lt]: new Date(now - answersKeptForMs) } } })
  await sequelize.query('DELETE FROM rate_limits WHERE expire < :now', {
    replacements: { now },
    type: QueryTypes.DELETE,
  })
}
