import { saveCutSheet } from '@/lib/data/cut-sheets'
import { handle } from '@/lib/http/handle'
import { jobParams, sheetSchema } from '@/lib/schemas/job'

export const POST = handle({
  who: ['journeyman'],
  params: jobParams,
  body: sheetSchema,
  idempotent: true,
  status: 201,
  run: ({ actor, params, body }) => saveCutSheet(actor, params.id, body),
})
