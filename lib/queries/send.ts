import type { Problem } from '@/lib/schemas/views'

/** A refusal of the API, with a sentence a reader can act on as its message. */
export class ProblemError extends Error {
  override name = 'ProblemError'
  constructor(
    readonly problem: Problem,
    readonly retryAfterSeconds?: number,
  ) {
    super(problem.detail ?? problem.errors?.[0]?.message ?? problem.title)
  }
}

interface Sending {
  body?: unknown
  /** A key of the caller's own for a call that makes something: keep it over retries. */
  key?: string
  signal?: AbortSignal
}

/** The one way the browser calls our API. @throws ProblemError; TypeError when there is no network. */
export async function send<Answer>(method: string, path: string, { body, key, signal }: Sending = {}): Promise<Answer> {
  const response = await fetch(path, {
    method,
    headers: {
      Accept: 'application/json',
      ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
      ...(key === undefined ? {} : { 'Idempotency-Key': key }),
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    ...(signal === undefined ? {} : { signal }),
  })
  if (!response.ok) throw await refusal(response)
  const text = await response.text()
  return (text === '' ? undefined : JSON.parse(text)) as Answer
}

/** What a refusing response says. */
export async function refusal(response: Response): Promise<ProblemError> {
  const fallback = { type: 'about:blank', title: 'Longpoint did not answer as it should.', status: response.status }
  const said: unknown = await response.json().catch(() => null)
  const wait = Number(response.headers.get('retry-after'))
  return new ProblemError(isProblem(said) ? said : fallback, wait > 0 ? wait : undefined)
}

function isProblem(said: unknown): said is Problem {
  return typeof said === 'object' && said !== null && 'status' in said && 'title' in said
}
