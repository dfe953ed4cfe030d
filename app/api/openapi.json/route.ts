import { allCalculators } from '@/lib/calculators'
import { handle } from '@/lib/http/handle'
import { described, openToAll, preflight } from '@/lib/http/open'
import { openapi } from '@/lib/schemas/openapi'

export const GET = openToAll(
  handle({ who: 'anyone', origin: 'any', run: async () => described(openapi(await allCalculators())) }),
)

export const OPTIONS = preflight('GET')
