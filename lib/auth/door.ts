import 'server-only'
import { AsyncLocalStorage } from 'node:async_hooks'
import { findForSignIn } from '@/lib/data/people'
import { openSignIn } from '@/lib/data/sign-ins'
import { TooMany } from '@/lib/errors'
import { signInSchema } from '@/lib/schemas/account'
import { countGuess, forgiveGuess } from './guessing'
import { verifyPassword } from './password'

interface Caller {
  address: string
  agent: string
  refusal?: TooMany
}

const callers = new AsyncLocalStorage<Caller>()

/**
 * Runs next-auth's handler for a caller. It turns everything its authorizing throws into one answer, so a refusal for
 * too many tries is carried past it.
 * @throws TooMany
 */
export async function atTheDoor(caller: Caller, answer: () => Promise<Response>): Promise<Response> {
  const response = await callers.run(caller, answer)
  if (caller.refusal) throw caller.refusal
  return response
}

/** Signs in with e-mail and password, or null: which of the two was wrong is not said, nor shown by the time it takes. */
export async function authorize(credentials: unknown): Promise<{ id: string; signIn: string } | null> {
  const caller = callers.getStore()
  const asked = signInSchema.safeParse(credentials)
  if (!caller || !asked.success) return null
  const { email, password } = asked.data
  try {
    await countGuess(email, caller.address)
  } catch (error) {
    if (!(error instanceof TooMany)) throw error
    caller.refusal = error
    return null
  }
  const person = await findForSignIn(email)
  const fits = await verifyPassword(person?.passwordHash ?? null, password)
  if (!person || !fits || person.disabled) return null
  await forgiveGuess(email, caller.address)
  return { id: person.id, signIn: await openSignIn(person.id, caller.agent) }
}
