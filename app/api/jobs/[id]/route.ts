import { changeJob, getJob } from '@/lib/data/jobs'
import { handle } from '@/lib/http/handle'
import { archiveSchema, jobChangeSchema, jobParams } from '@/lib/schemas/job'

export const GET = handle({
  who: ['journeyman', 'coordinator'],
  params: jobParams,
  run: ({ actor, params }) => getJob(actor, params.id),
})

export const PATCH = handle({
  who: ['journeyman'],
  params: jobParams,
  body: jobChangeSchema,
  run: ({ actor, params, body }) => changeJob(actor, params.id, body),
})

/** Puts the job away. It stays, with its sheets, and a change of `archived` takes it out again. */
export const DELETE = handle({
  who: ['journeyman'],
  params: jobParams,
  body: archiveSchema,
  run: ({ actor, params, body }) => changeJob(actor, params.id, { archived: true, version: body.version }),
})
