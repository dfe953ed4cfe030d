import { randomUUID } from 'node:crypto'
import type { Problem } from '@/lib/schemas/views'
import type { Person } from './people'

export const origin = 'http://localhost:3000'

type Handler = (request: Request, context: { params: Promise<unknown> }) => Promise<Response>

export interface Sent {
  as?: Person | undefined
  params?: object
  query?: string
  /** Sent as JSON; a string is sent as it is. */
  body?: unknown
  headers?: { [name: string]: string | null }
}

/** Calls a route's handler as a browser on one of our pages would, with a new idempotency key. */
export async function call(handler: Handler, method: string, sent: Sent = {}): Promise<Response> {
  return handler(requestOf(method, sent), { params: Promise.resolve(sent.params ?? {}) })
}

function requestOf(method: string, { as, query = '', body, headers = {} }: Sent): Request {
  const given = new Headers(method === 'GET' ? {} : { Origin: origin, 'Idempotency-Key': randomUUID() })
  if (as) given.set('Cookie', as.cookie)
  if (body !== undefined) given.set('Content-Type', 'application/json')
  for (const [name, value] of Object.entries(headers)) {
    if (value === null) given.delete(name)
    else given.set(name, value)
  }
  const text = typeof body === 'string' ? body : JSON.stringify(body)
  return new Request(`${origin}/api/test${query}`, {
    method,
    headers: given,
    ...(body === undefined ? {} : { body: text }),
  })
}

/** The answer's JSON. */
export async function read<Answer>(response: Response): Promise<Answer> {
  return (await response.json()) as Answer
}

/** What a refusal says, after a look at its form. Throws when it is no problem+json. */
export async function problemIn(response: Response): Promise<Problem> {
  const type = response.headers.get('content-type')
  const problem = await read<Problem>(response)
  const sound = type === 'application/problem+json' && problem.status === response.status && problem.title !== ''
  if (!sound) throw new Error(`No problem+json: ${response.status} ${type} ${JSON.stringify(problem)}`)
  return problem
}
