import { passwordSchema, preferencesChangeSchema, preferencesSchema, startSchema } from './account'
import { archiveSchema, jobChangeSchema, jobSchema, sheetRevisionSchema, sheetSchema } from './job'
import { json, page, problem, refusals } from './openapi-parts'
import { papers } from './sheet'
import { accountSchema, jobsPageSchema, jobViewSchema, meSchema, revisionLineSchema, sheetViewSchema } from './views'
import { z } from './zod'

interface Operation {
  summary: string
  body?: z.ZodType
  answer?: z.ZodType
  status?: 200 | 201 | 204
  parameters?: readonly object[]
  /** Makes a row: it comes with an Idempotency-Key. */
  creates?: boolean
  /** May be overtaken by somebody else's save. */
  versioned?: boolean
  open?: boolean
  /** Answers with a page to print. */
  prints?: boolean
}

const inPath = (name: string, type: z.ZodType) => ({ name, in: 'path', required: true, schema: z.toJSONSchema(type) })
const inQuery = (name: string, type: z.ZodType) => ({ name, in: 'query', schema: z.toJSONSchema(type) })
const job = inPath('id', z.uuid())
const sheet = inPath('sheet', z.int().min(1))
const key = {
  name: 'Idempotency-Key',
  in: 'header',
  required: true,
  schema: { type: 'string', minLength: 8, maxLength: 100 },
}

function operation({
  summary,
  body,
  answer,
  status = 200,
  parameters = [],
  creates,
  versioned,
  open,
  prints,
}: Operation) {
  return {
    summary,
    parameters: creates ? [...parameters, key] : parameters,
    security: open ? [] : [{ session: [] }],
    ...(body ? { requestBody: { required: true, content: json(body, 'input') } } : {}),
    responses: {
      [status]: prints ? page : { description: 'Done', ...(answer ? { content: json(answer) } : {}) },
      ...(body ? refusals : {}),
      ...(open
        ? {}
        : { '401': problem('No standing session.'), '403': problem('Not for this role, or not from our own pages.') }),
      ...(parameters.length > 0 ? { '404': problem('Missing, or another shop’s.') } : {}),
      ...(versioned ? { '409': problem('Saved elsewhere in between; `current` is the version that stands.') } : {}),
    },
  }
}

const madeJob = z.object({ id: z.uuid(), version: z.int() })
const version = z.object({ version: z.int() })
const place = z.object({ sheet: z.int(), revision: z.int() })

/** What people who sign in use: their account and the job book. */
export const shopPaths = {
  '/api/me': { get: operation({ summary: 'Who is signed in, or null', answer: meSchema.nullable(), open: true }) },
  '/api/start': {
    post: operation({ summary: 'Open a one-person shop', body: startSchema, status: 201, creates: true, open: true }),
  },
  '/api/account': { get: operation({ summary: 'The own account and its sessions', answer: accountSchema }) },
  '/api/account/preferences': {
    patch: operation({
      summary: 'Change the named preferences',
      body: preferencesChangeSchema,
      answer: preferencesSchema,
    }),
  },
  '/api/account/password': {
    post: operation({
      summary: 'Change the password, sign out elsewhere',
      body: passwordSchema,
      status: 204,
      versioned: true,
    }),
  },
  '/api/account/sign-ins': {
    delete: operation({ summary: 'Sign out everywhere but here', answer: z.object({ ended: z.int() }) }),
  },
  '/api/jobs': {
    get: operation({
      summary: 'Jobs of the shop, last changed first',
      parameters: [inQuery('cursor', z.string()), inQuery('archived', z.enum(['yes', 'no']))],
      answer: jobsPageSchema,
    }),
    post: operation({ summary: 'Open a job', body: jobSchema, answer: madeJob, status: 201, creates: true }),
  },
  '/api/jobs/{id}': {
    get: operation({ summary: 'One job with its sheets', parameters: [job], answer: jobViewSchema }),
    patch: operation({
      summary: 'Change the named fields',
      parameters: [job],
      body: jobChangeSchema,
      answer: version,
      versioned: true,
    }),
    delete: operation({
      summary: 'Put the job away',
      parameters: [job],
      body: archiveSchema,
      answer: version,
      versioned: true,
    }),
  },
  '/api/jobs/{id}/sheets': {
    post: operation({
      summary: 'Save a cut sheet',
      parameters: [job],
      body: sheetSchema,
      answer: place,
      status: 201,
      creates: true,
    }),
  },
  '/api/jobs/{id}/sheets/{sheet}': {
    get: operation({
      summary: 'One revision of a cut sheet, the current one unless named',
      parameters: [job, sheet, inQuery('revision', z.int().min(1))],
      answer: sheetViewSchema,
    }),
    post: operation({
      summary: 'Save the next revision',
      parameters: [job, sheet],
      body: sheetRevisionSchema,
      answer: place,
      status: 201,
      creates: true,
      versioned: true,
    }),
  },
  '/api/jobs/{id}/sheets/{sheet}/pdf': {
    get: operation({
      summary: 'A revision as it is printed; an earlier one says that it is superseded',
      parameters: [job, sheet, inQuery('revision', z.int().min(1)), inQuery('paper', z.enum(papers))],
      prints: true,
    }),
  },
  '/api/jobs/{id}/sheets/{sheet}/revisions': {
    get: operation({
      summary: 'All revisions, newest first',
      parameters: [job, sheet],
      answer: z.array(revisionLineSchema),
    }),
  },
}
