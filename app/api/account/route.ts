import { getAccount } from '@/lib/data/account'
import { handle } from '@/lib/http/handle'

export const GET = handle({ who: 'signed-in', run: ({ actor }) => getAccount(actor) })
