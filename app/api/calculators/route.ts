import { allCalculators } from '@/lib/calculators'
import { handle } from '@/lib/http/handle'
import { described, openToAll, preflight } from '@/lib/http/open'
import { listing } from '@/lib/schemas/openapi'

export const GET = openToAll(
  handle({ who: 'anyone', origin: 'any', run: async () => described(listing(await allCalculators())) }),
)

export const OPTIONS = preflight('GET')
