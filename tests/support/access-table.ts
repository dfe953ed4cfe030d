import { actors, type Actor } from './access-actors'
import type { Ground } from './access-ground'
import { sheetForm } from './jobs'

/** How a route is asked, and the status each actor must get. */
export interface Row {
  params?: (ground: Ground) => object
  query?: string
  body?: (ground: Ground) => unknown
  answers: { [actor in Actor]: number }
}

/** Whoever asks, one status. */
function everybody(status: number): Row['answers'] {
  const same = Object.fromEntries(actors.map((actor) => [actor, status])) as Row['answers']
  return same
}

/** A standing session is all it takes. */
const signedIn = (status = 200): Row['answers'] => ({ ...everybody(status), anonymous: 401, disabled: 401 })

/** The job book: the shop's journeymen, and its coordinator as far as reading goes. `foreign` is what other shops' see. */
function jobBook(
  status: number,
  coordinator: number,
  foreign: { journeyman: number; coordinator: number },
): Row['answers'] {
  return {
    anonymous: 401,
    owner: status,
    mate: status,
    apprentice: 403,
    instructor: 403,
    coordinator,
    foreigner: foreign.journeyman,
    'foreign coordinator': foreign.coordinator,
    disabled: 401,
  }
}

const readsJob = jobBook(200, 200, { journeyman: 404, coordinator: 404 })
const writesJob = (status: number) => jobBook(status, 403, { journeyman: 404, coordinator: 403 })

const job = ({ job: id }: Ground) => ({ id })
const miter = () => ({ id: 'miter' })
const sheet = ({ job: id }: Ground) => ({ id, sheet: '1' })

/** Every route handler of ours. One that is not here fails the test. */
export const accessTable: { [route: string]: Row } = {
  // Only what the screens use is open; asked without next-auth's token it sends nobody anywhere.
  'auth/[...nextauth] GET': { params: () => ({ nextauth: ['session'] }), answers: everybody(404) },
  'auth/[...nextauth] POST': { params: () => ({ nextauth: ['signin', 'credentials'] }), answers: everybody(404) },
  'calculators GET': { answers: everybody(200) },
  'calculators OPTIONS': { answers: everybody(204) },
  'calculators/[id] GET': { params: miter, answers: everybody(200) },
  'calculators/[id] POST': { params: miter, body: () => ({ inputs: sheetForm.inputs }), answers: everybody(200) },
  'calculators/[id] OPTIONS': { params: miter, answers: everybody(204) },
  'calculators/[id]/sheet POST': { params: miter, body: () => ({ inputs: sheetForm.inputs }), answers: everybody(200) },
  'calculators/[id]/sheet OPTIONS': { params: miter, answers: everybody(204) },
  'openapi.json GET': { answers: everybody(200) },
  'openapi.json OPTIONS': { answers: everybody(204) },
  'me GET': { answers: everybody(200) },
  'start POST': { body: () => ({}), answers: everybody(422) },
  'account GET': { answers: signedIn() },
  'account/password POST': { body: () => ({}), answers: signedIn(422) },
  'account/preferences PATCH': { body: () => ({ units: 'mm' }), answers: signedIn() },
  'account/sign-ins DELETE': { answers: signedIn() },
  'jobs GET': { answers: jobBook(200, 200, { journeyman: 200, coordinator: 200 }) },
  'jobs POST': { body: () => ({ name: 'A job' }), answers: jobBook(201, 403, { journeyman: 201, coordinator: 403 }) },
  'jobs/[id] GET': { params: job, answers: readsJob },
  'jobs/[id] PATCH': { params: job, body: () => ({ notes: 'x', version: 1 }), answers: writesJob(200) },
  'jobs/[id] DELETE': { params: job, body: () => ({ version: 1 }), answers: writesJob(200) },
  'jobs/[id]/sheets POST': { params: job, body: () => sheetForm, answers: writesJob(201) },
  'jobs/[id]/sheets/[sheet] GET': { params: sheet, answers: readsJob },
  'jobs/[id]/sheets/[sheet] POST': {
    params: sheet,
    body: () => ({ ...sheetForm, note: 'again', revises: 1 }),
    answers: writesJob(201),
  },
  'jobs/[id]/sheets/[sheet]/pdf GET': { params: sheet, answers: readsJob },
  'jobs/[id]/sheets/[sheet]/revisions GET': { params: sheet, answers: readsJob },
}
