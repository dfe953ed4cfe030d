import { computeCalculator } from '@/lib/calculators/compute'
import { calculatorIds, loadCalculator } from '@/lib/calculators/load'
import { Unfit } from '@/lib/errors'
import { handle } from '@/lib/http/handle'
import { described, openToAll, preflight } from '@/lib/http/open'
import { askSchema, descriptionOf } from '@/lib/schemas/calculator'
import { z } from '@/lib/schemas/zod'

const params = z.object({ id: z.enum(calculatorIds) })

export const GET = openToAll(
  handle({
    who: 'anyone',
    origin: 'any',
    params,
    run: async ({ params: { id } }) => described(descriptionOf(await loadCalculator(id))),
  }),
)

export const POST = openToAll(
  handle({
    who: 'anyone',
    origin: 'any',
    params,
    body: askSchema,
    run: async ({ params: { id }, body }) => {
      const computed = await computeCalculator(id, body.inputs, body.precision)
      if (!computed.ok) throw new Unfit(computed.errors)
      return computed.answer
    },
  }),
)

export const OPTIONS = preflight('GET, POST')
