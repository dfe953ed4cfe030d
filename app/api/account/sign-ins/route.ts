import { endOtherSignIns } from '@/lib/data/account'
import { handle } from '@/lib/http/handle'

/** Signs out everywhere but here. */
export const DELETE = handle({
  who: 'signed-in',
  run: async ({ actor }) => ({ ended: await endOtherSignIns(actor) }),
})
