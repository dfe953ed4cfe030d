import 'server-only'
import { UniqueConstraintError } from 'sequelize'
import { hashPassword } from '@/lib/auth/password'
import { Unfit } from '@/lib/errors'
import type { StartForm } from '@/lib/schemas/account'
import { Shop, User } from '@/models'
import { record } from './audit'
import { inTransaction } from './transaction'

/** What signing in needs to know of whoever has this e-mail address, in small letters. For `lib/auth` only. */
export async function findForSignIn(email: string) {
  const user = await User.findOne({ where: { email }, attributes: ['id', 'passwordHash', 'disabledAt'], raw: true })
  return user && { id: user.id, passwordHash: user.passwordHash, disabled: user.disabledAt !== null }
}

/**
 * Opens a one-person shop and its journeyman, together or not at all.
 * @throws Unfit when the e-mail address has an account.
 */
export async function openShop({ name, shop, email, password }: StartForm): Promise<void> {
  const passwordHash = await hashPassword(password)
  await inTransaction(async (transaction) => {
    const { id: shopId } = await Shop.create({ name: shop }, { transaction })
    const person = { shopId, name, email, passwordHash, role: 'journeyman' } as const
    const { id: userId } = await User.create(person, { transaction }).catch(refuseKnownEmail)
    await record({ shopId, userId, action: 'shop.opened', subjectId: shopId }, transaction)
  })
}

function refuseKnownEmail(error: unknown): never {
  if (!(error instanceof UniqueConstraintError)) throw error
  throw new Unfit([
    { field: 'email', message: 'This address signs in already: go to the sign-in, or use another one.' },
  ])
}
