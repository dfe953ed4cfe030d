import { randomUUID } from 'node:crypto'
import { Conflict, Denied, NotFound, TooMany, Unfit } from '@/lib/errors'
import { log } from '@/lib/log'
import type { Problem } from '@/lib/schemas/views'
import { z } from '@/lib/schemas/zod'

/** What went off before any data was asked: the request itself. */
export class BadRequest extends Error {
  override name = 'BadRequest'
  constructor(
    readonly status: 400 | 401 | 403 | 413 | 415,
    message: string,
  ) {
    super(message)
  }
}

const titles: { [status: number]: string } = {
  400: 'The request cannot be read',
  401: 'Sign in first',
  403: 'Not yours to do',
  404: 'Nothing is there',
  409: 'Saved elsewhere in between',
  413: 'Too large',
  415: 'Not JSON',
  422: 'Some of this cannot be taken',
  429: 'Too many tries',
  500: 'Something broke on our side',
}

/** One answer in the form of RFC 9457. */
export function problem(status: number, more: Partial<Problem> = {}, headers: HeadersInit = {}): Response {
  const body = { type: 'about:blank', title: titles[status] ?? 'Refused', status, ...more }
  return Response.json(body, {
    status,
    headers: { 'Cache-Control': 'no-store', ...headers, 'Content-Type': 'application/problem+json' },
  })
}

/** What a route answers to whatever its work threw. The text of what was not expected goes to the log only. */
export function problemOf(error: unknown): Response {
  if (error instanceof BadRequest) return problem(error.status, { detail: error.message })
  if (error instanceof NotFound) return problem(404)
  if (error instanceof Denied) return problem(403, { detail: error.message })
  if (error instanceof Conflict) return problem(409, { detail: error.message, ...currentOf(error) })
  if (error instanceof Unfit) return problem(422, { errors: error.errors })
  if (error instanceof z.ZodError) return problem(422, { errors: faultsOf(error) })
  if (error instanceof TooMany)
    return problem(429, { detail: error.message }, { 'Retry-After': String(error.retryAfterSeconds) })
  return unexpected(error)
}

const currentOf = ({ current }: Conflict) => (current === undefined ? {} : { current })

function faultsOf(error: z.ZodError) {
  return error.issues.map(({ path, message }) => ({ field: path.join('.') || 'body', message }))
}

function unexpected(error: unknown): Response {
  const id = randomUUID()
  log.error({ id, err: error }, 'unexpected')
  return problem(500, { detail: `Nothing was saved. If it stays, tell us this number: ${id}`, id })
}
