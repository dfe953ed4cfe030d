import { keptSheet } from '@/components/sheet/kept-sheet'
import { config } from '@/lib/config'
import { getCutSheet } from '@/lib/data/read-sheets'
import { NotFound } from '@/lib/errors'
import { handle } from '@/lib/http/handle'
import { pdfAnswer } from '@/lib/http/pdf-answer'
import { sheetToPdf } from '@/lib/print/pdf/sheet-to-pdf'
import { sheetParams } from '@/lib/schemas/job'
import { keptSheetQuery } from '@/lib/schemas/sheet'

/** A kept sheet as it is printed; an earlier revision says that it is superseded. */
export const GET = handle({
  who: ['journeyman', 'coordinator'],
  params: sheetParams,
  query: keptSheetQuery,
  run: async ({ actor, params: { id, sheet: number }, query: { revision, paper } }) => {
    const view = await getCutSheet(actor, id, number, revision)
    const sheet = await keptSheet(view, actor.preferences, config().APP_ORIGIN)
    if (!sheet) throw new NotFound()
    return pdfAnswer(await sheetToPdf(sheet, paper), `sheet-${view.sheet}-revision-${view.revision}`)
  },
})
