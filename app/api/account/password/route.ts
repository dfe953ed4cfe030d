import { changePassword } from '@/lib/data/account'
import { handle } from '@/lib/http/handle'
import { passwordSchema } from '@/lib/schemas/account'

/** Whoever found a device signed in may not guess on from there. */
export const POST = handle({
  who: 'signed-in',
  body: passwordSchema,
  limit: { name: 'password', points: 10, seconds: 900 },
  run: ({ actor, body }) => changePassword(actor, body),
})
