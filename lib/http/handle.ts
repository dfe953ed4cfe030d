import 'server-only'
import type { Actor } from '@/lib/auth/actor'
import { countTry } from '@/lib/auth/guessing'
import type { Limit } from '@/lib/data/limiter'
import type { z } from '@/lib/schemas/zod'
import { admit, type Who } from './admit'
import { answerOf } from './answer'
import { parseJson, readText } from './body'
import { addressOf } from './client-address'
import { answerOnce } from './once'
import { requireOwnOrigin } from './origin'
import { problem, problemOf } from './problem'

/** What a route's work is given. */
export interface Asked<W extends Who, Params, Query, Body> {
  request: Request
  /** Null where anyone may call: such a route asks no session. */
  actor: W extends 'anyone' ? null : Actor
  params: Params
  query: Query
  body: Body
}

/** One route: who may call it, what it takes, what it does. What is left out refuses, never allows. */
export interface Rule<W extends Who, P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType> {
  who: W
  /** `any` lets pages of other sites call; for routes that know no session. */
  origin?: W extends 'anyone' ? 'own' | 'any' : 'own'
  params?: P
  query?: Q
  body?: B
  /** How often one person, or one address without a session, may call. */
  limit?: Limit
  /** The call makes a row: it comes with an Idempotency-Key, and a repeat gets the first answer. */
  idempotent?: boolean
  /** Of a good answer; without one 200, or 204 when there is nothing to say. */
  status?: 200 | 201
  run: (asked: Asked<W, z.output<P>, z.output<Q>, z.output<B>>) => Promise<object | null | undefined | void>
}

interface Context {
  params: Promise<unknown>
}

const changesNothing = ['GET', 'HEAD', 'OPTIONS']

/**
 * The one wrapper of every route handler: origin, actor, reading and checking what was sent, limit, repeats, and every
 * refusal as problem+json.
 */
export function handle<
  W extends Who,
  P extends z.ZodType = z.ZodUndefined,
  Q extends z.ZodType = z.ZodUndefined,
  B extends z.ZodType = z.ZodUndefined,
>(rule: Rule<W, P, Q, B>) {
  return async (request: Request, context: Context): Promise<Response> => {
    try {
      if (rule.origin !== 'any' && !changesNothing.includes(request.method)) requireOwnOrigin(request)
      const actor = await admit(rule.who, request)
      const params = rule.params?.safeParse(await context.params)
      if (params?.success === false) return problem(404)
      if (rule.limit) await countTry(rule.limit, actor?.userId ?? addressOf(request))
      const text = rule.body ? await readText(request) : ''
      const asked = {
        request,
        actor,
        params: params?.data,
        query: rule.query?.parse(Object.fromEntries(new URL(request.url).searchParams)),
        body: rule.body?.parse(parseJson(request, text) ?? {}),
      } as Asked<W, z.output<P>, z.output<Q>, z.output<B>>
      const work = () => rule.run(asked)
      if (rule.idempotent) return await answerOnce({ request, actor, text, status: rule.status ?? 200 }, work)
      return answerOf(await work(), rule.status)
    } catch (error) {
      return problemOf(error)
    }
  }
}
