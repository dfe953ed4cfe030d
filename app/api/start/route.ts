import { openShop } from '@/lib/data/people'
import { handle } from '@/lib/http/handle'
import { startSchema } from '@/lib/schemas/account'

/** Opens a one-person shop; its journeyman then signs in. */
export const POST = handle({
  who: 'anyone',
  body: startSchema,
  limit: { name: 'start', points: 20, seconds: 3600 },
  idempotent: true,
  status: 201,
  run: async ({ body }) => openShop(body),
})
