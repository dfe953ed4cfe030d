import { handbookPath, sheetOf } from '@/components/sheet/sheet-of'
import { computeCalculator, readPrecision } from '@/lib/calculators/compute'
import { calculatorIds } from '@/lib/calculators/load'
import { config } from '@/lib/config'
import { Unfit } from '@/lib/errors'
import { handle } from '@/lib/http/handle'
import { openToAll, preflight } from '@/lib/http/open'
import { pdfAnswer } from '@/lib/http/pdf-answer'
import { sheetToPdf } from '@/lib/print/pdf/sheet-to-pdf'
import { sheetAskSchema } from '@/lib/schemas/sheet'
import { z } from '@/lib/schemas/zod'

/** The printable sheet of the same inputs as the calculator takes. */
export const POST = openToAll(
  handle({
    who: 'anyone',
    origin: 'any',
    params: z.object({ id: z.enum(calculatorIds) }),
    body: sheetAskSchema,
    limit: { name: 'sheet', points: 120, seconds: 600 },
    run: async ({ params: { id }, body: { inputs, precision: asked, paper, head, units, sawSquare } }) => {
      const precision = readPrecision(asked)
      if (Array.isArray(precision)) throw new Unfit(precision)
      const computed = await computeCalculator(id, inputs, precision)
      if (!computed.ok) throw new Unfit(computed.errors)
      const sheet = await sheetOf(id, {
        ...{ head, answer: computed.answer },
        reading: { precision, preferences: { units, sawSquare } },
        address: config().APP_ORIGIN + (await handbookPath(id, inputs)),
      })
      return pdfAnswer(await sheetToPdf(sheet, paper), id)
    },
  }),
)

export const OPTIONS = preflight('POST')
