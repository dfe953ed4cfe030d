import { createJob, listJobs } from '@/lib/data/jobs'
import { handle } from '@/lib/http/handle'
import { jobSchema, jobsQuery } from '@/lib/schemas/job'

export const GET = handle({
  who: ['journeyman', 'coordinator'],
  query: jobsQuery,
  run: ({ actor, query }) => listJobs(actor, query),
})

export const POST = handle({
  who: ['journeyman'],
  body: jobSchema,
  idempotent: true,
  status: 201,
  run: ({ actor, body }) => createJob(actor, body),
})
