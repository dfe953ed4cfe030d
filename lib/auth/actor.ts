import 'server-only'
import { standingOf, type Standing } from '@/lib/data/sign-ins'
import type { Preferences, Role } from '@/lib/schemas/account'
import { idField } from '@/lib/schemas/text'

/**
 * Who asks. Only a session's own row makes one, so no request body can be an actor, and React refuses to hand a class
 * to the browser.
 */
export class Actor {
  readonly userId: string
  readonly shopId: string
  readonly role: Role
  readonly name: string
  readonly crewIds: readonly string[]
  readonly preferences: Preferences

  private constructor(
    readonly signInId: string,
    { userId, shopId, role, name, crewIds, ...preferences }: Standing,
  ) {
    this.userId = userId
    this.shopId = shopId
    this.role = role
    this.name = name
    this.crewIds = crewIds
    this.preferences = preferences
  }

  /** Reads role, crews and standing at this moment; null when the session has ended or the person is disabled. */
  static async of(signInId: unknown, userId: unknown): Promise<Actor | null> {
    const [session, person] = [idField.safeParse(signInId), idField.safeParse(userId)]
    if (!session.success || !person.success) return null
    const standing = await standingOf(session.data, person.data)
    return standing && new Actor(session.data, standing)
  }
}
