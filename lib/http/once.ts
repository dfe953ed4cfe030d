import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import { once } from '@/lib/data/idempotency'
import { answerOf } from './answer'
import { BadRequest } from './problem'

interface Given {
  request: Request
  actor: Actor | null
  text: string
  status: number
}

const keyForm = /^[\x21-\x7e]{8,100}$/

/** Does the work once for the caller's Idempotency-Key and answers a repeat alike. @throws BadRequest 400 without a key. */
export async function answerOnce(
  { request, actor, text, status }: Given,
  work: () => Promise<object | null | undefined | void>,
) {
  const key = request.headers.get('idempotency-key') ?? ''
  if (!keyForm.test(key))
    throw new BadRequest(400, 'Send an Idempotency-Key of 8 to 100 characters, a new one for each thing to be made.')
  const asked = [request.method, new URL(request.url).pathname, text].join('\n')
  const call = { owner: actor?.userId ?? 'anyone', key, asked }
  const kept = await once(call, status, async () => (await work()) ?? {})
  return answerOf(kept.answer ?? {}, kept.status)
}
