import 'server-only'
import { Op, type Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { hashPassword, verifyPassword } from '@/lib/auth/password'
import { Conflict, NotFound, Unfit } from '@/lib/errors'
import type { PasswordForm, Preferences } from '@/lib/schemas/account'
import { passwordFault } from '@/lib/schemas/password'
import type { Account } from '@/lib/schemas/views'
import { Shop, SignIn, User } from '@/models'
import { record } from './audit'
import { post } from './outbox'
import { inTransaction } from './transaction'

/** The actor's own account, and where it is signed in. */
export async function getAccount(actor: Actor): Promise<Account> {
  const [user, shop, signIns] = await Promise.all([
    User.findOne({ where: { id: actor.userId }, attributes: ['email'], raw: true }),
    Shop.findOne({ where: { id: actor.shopId }, attributes: ['name'], raw: true }),
    openSignIns(actor),
  ])
  if (!user || !shop) throw new NotFound()
  const { name, role, preferences } = actor
  return { name, role, preferences, email: user.email, shop: shop.name, signIns }
}

async function openSignIns(actor: Actor): Promise<Account['signIns']> {
  const rows = await SignIn.findAll({
    where: { userId: actor.userId, endedAt: { [Op.is]: null } },
    attributes: ['id', 'startedAt', 'lastSeenAt', 'agent'],
    order: [['lastSeenAt', 'DESC']],
    limit: 50,
    raw: true,
  })
  return rows.map(({ id, startedAt, lastSeenAt, agent }) => ({
    id,
    startedAt: startedAt.toISOString(),
    lastSeenAt: lastSeenAt.toISOString(),
    agent,
    thisOne: id === actor.signInId,
  }))
}

/** Changes the named preferences and leaves the others. */
export async function savePreferences(actor: Actor, change: Partial<Preferences>): Promise<Preferences> {
  const { units, tape, sawSquare, dialStep, theme } = { ...actor.preferences, ...change }
  await User.update(change, {
    where: { id: actor.userId },
    fields: ['units', 'tape', 'sawSquare', 'dialStep', 'theme'],
  })
  return { units, tape, sawSquare, dialStep, theme }
}

/**
 * Changes the password, signs out everywhere else, and writes to the owner that it happened.
 * @throws Unfit when the present one does not fit or the new one is guessed early.
 * @throws Conflict when it was changed in between.
 */
export async function changePassword(actor: Actor, { currentPassword, password }: PasswordForm): Promise<void> {
  const user = await User.findOne({
    where: { id: actor.userId },
    attributes: ['passwordHash', 'email', 'version'],
    raw: true,
  })
  if (!user || !(await verifyPassword(user.passwordHash, currentPassword)))
    throw new Unfit([{ field: 'currentPassword', message: 'That is not the password you use now.' }])
  const fault = passwordFault(password, [actor.name, user.email])
  if (fault !== null) throw new Unfit([{ field: 'password', message: fault }])
  const passwordHash = await hashPassword(password)
  await inTransaction(async (transaction) => {
    const [changed] = await User.update(
      { passwordHash, version: user.version + 1 },
      { where: { id: actor.userId, version: user.version }, transaction },
    )
    if (changed === 0) throw new Conflict('The account was changed elsewhere in between. Sign in again.')
    await endOthers(actor, transaction)
    await record({ ...subject(actor), action: 'password.changed' }, transaction)
    await post({ kind: 'password-changed', recipient: user.email, payload: { name: actor.name } }, transaction)
  })
}

/** Signs out everywhere but here. Gives how many sessions ended. */
export async function endOtherSignIns(actor: Actor): Promise<number> {
  return inTransaction(async (transaction) => {
    const ended = await endOthers(actor, transaction)
    await record({ ...subject(actor), action: 'sign-ins.ended', details: { ended } }, transaction)
    return ended
  })
}

const subject = ({ shopId, userId }: Actor) => ({ shopId, userId, subjectId: userId })

async function endOthers(actor: Actor, transaction: Transaction): Promise<number> {
  const others = { userId: actor.userId, endedAt: { [Op.is]: null }, id: { [Op.ne]: actor.signInId } }
  const [ended] = await SignIn.update({ endedAt: new Date() }, { where: others, transaction })
  return ended
}
