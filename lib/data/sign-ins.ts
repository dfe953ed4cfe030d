import 'server-only'
import { Op, QueryTypes } from 'sequelize'
import type { Preferences, Role } from '@/lib/schemas/account'
import { sequelize, SignIn } from '@/models'

/** What the database says of a signed-in person at this moment. */
export interface Standing extends Preferences {
  userId: string
  shopId: string
  name: string
  role: Role
  crewIds: string[]
}

interface StandingRow extends Omit<Standing, 'crewIds'> {
  crews: string | null
  lastSeenAt: Date
}

const seenEveryMs = 10 * 60_000

/** Opens a session and gives its id. */
export async function openSignIn(userId: string, agent: string): Promise<string> {
  const now = new Date()
  const { id } = await SignIn.create({ userId, startedAt: now, lastSeenAt: now, agent: agent.slice(0, 200) })
  return id
}

/** Who is signed in by this session, or null when it has ended or the person is disabled. One statement. */
export async function standingOf(signInId: string, userId: string): Promise<Standing | null> {
  const row = await sequelize.query<StandingRow>(
    `SELECT u.id AS userId, u.shopId, u.name, u.role, u.units, u.tape, u.sawSquare, u.dialStep, u.theme, s.lastSeenAt,
            (SELECT GROUP_CONCAT(m.crewId) FROM crew_members m WHERE m.userId = u.id) AS crews
     FROM sign_ins s JOIN users u ON u.id = s.userId
     WHERE s.id = :signInId AND s.userId = :userId AND s.endedAt IS NULL AND u.disabledAt IS NULL`,
    { replacements: { signInId, userId }, type: QueryTypes.SELECT, plain: true },
  )
  if (row === null) return null
  const { crews, lastSeenAt, ...standing } = row
  if (Date.now() - lastSeenAt.getTime() > seenEveryMs)
    await SignIn.update({ lastSeenAt: new Date() }, { where: { id: signInId } })
  return { ...standing, crewIds: crews?.split(',') ?? [] }
}

/** Signs out: the session's cookie opens nothing from now on. */
export async function endSignIn(signInId: string, userId: string): Promise<void> {
  await SignIn.update({ endedAt: new Date() }, { where: { id: signInId, userId, endedAt: { [Op.is]: null } } })
}
