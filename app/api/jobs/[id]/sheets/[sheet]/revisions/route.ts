import { listRevisions } from '@/lib/data/read-sheets'
import { handle } from '@/lib/http/handle'
import { sheetParams } from '@/lib/schemas/job'

export const GET = handle({
  who: ['journeyman', 'coordinator'],
  params: sheetParams,
  run: ({ actor, params }) => listRevisions(actor, params.id, params.sheet),
})
