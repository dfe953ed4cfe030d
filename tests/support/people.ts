import { randomUUID } from 'node:crypto'
import { encode } from 'next-auth/jwt'
import { sessionCookie } from '@/lib/auth/cookies'
import { hashPassword } from '@/lib/auth/password'
import { config } from '@/lib/config'
import { openSignIn } from '@/lib/data/sign-ins'
import type { Role } from '@/lib/schemas/account'
import { Crew, CrewMember, Shop, User } from '@/models'

export const password = 'seven grey herons walking'
const passwordHash = await hashPassword(password)

export interface Person {
  id: string
  shopId: string
  email: string
  signIn: string
  /** The header that a browser of theirs sends. */
  cookie: string
}

export async function newShop(): Promise<string> {
  const { id } = await Shop.create({ name: 'Test shop' })
  return id
}

/** A signed-in person of a shop; without one, of a shop of their own. */
export async function newPerson(role: Role, shopId?: string): Promise<Person> {
  const shop = shopId ?? (await newShop())
  const email = `${randomUUID()}@test.example`
  const { id } = await User.create({ shopId: shop, name: `A ${role}`, email, passwordHash, role })
  const signIn = await openSignIn(id, 'test')
  return { id, shopId: shop, email, signIn, cookie: await cookieFor(id, signIn) }
}

/** Puts a person into a crew of their shop. */
export async function joinCrew(person: Person, place: 'apprentice' | 'instructor'): Promise<string> {
  const { id } = await Crew.create({ shopId: person.shopId, name: randomUUID() })
  await CrewMember.create({ crewId: id, userId: person.id, place })
  return id
}

/** The cookie of a session, made as the sign-in makes it. */
export async function cookieFor(userId: string, signIn: string): Promise<string> {
  const token = await encode({ token: { sub: userId, signIn }, secret: config().AUTH_SECRET })
  return `${sessionCookie()}=${token}`
}
