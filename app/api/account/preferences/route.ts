import { savePreferences } from '@/lib/data/account'
import { handle } from '@/lib/http/handle'
import { preferencesChangeSchema } from '@/lib/schemas/account'

export const PATCH = handle({
  who: 'signed-in',
  body: preferencesChangeSchema,
  run: ({ actor, body }) => savePreferences(actor, body),
})
