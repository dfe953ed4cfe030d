import { reviseCutSheet } from '@/lib/data/cut-sheets'
import { getCutSheet } from '@/lib/data/read-sheets'
import { handle } from '@/lib/http/handle'
import { revisionQuery, sheetParams, sheetRevisionSchema } from '@/lib/schemas/job'

export const GET = handle({
  who: ['journeyman', 'coordinator'],
  params: sheetParams,
  query: revisionQuery,
  run: ({ actor, params, query }) => getCutSheet(actor, params.id, params.sheet, query.revision),
})

/** The next revision. */
export const POST = handle({
  who: ['journeyman'],
  params: sheetParams,
  body: sheetRevisionSchema,
  idempotent: true,
  status: 201,
  run: ({ actor, params, body }) => reviseCutSheet(actor, params.id, params.sheet, body),
})
