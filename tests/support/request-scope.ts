import { AsyncLocalStorage } from 'node:async_hooks'
import { createRequire } from 'node:module'

interface NextHeaders {
  headers: () => Promise<Headers>
  cookies: () => Promise<{ getAll: () => { name: string; value: string }[] }>
}

const requests = new AsyncLocalStorage<Request>()
const headersNow = () => requests.getStore()?.headers ?? new Headers()

// next-auth asks Next for the headers of the request under way. Outside of Next there is none, so it is told here.
const next = createRequire(import.meta.url)('next/headers') as NextHeaders
next.headers = () => Promise.resolve(headersNow())
next.cookies = () => Promise.resolve({ getAll: () => pairsOf(headersNow().get('cookie') ?? '') })

/** Lets next-auth see `request` as the one under way while `work` runs. */
export function underWay<Result>(request: Request, work: () => Promise<Result>): Promise<Result> {
  return requests.run(request, work)
}

function pairsOf(cookie: string) {
  return cookie
    .split('; ')
    .filter(Boolean)
    .map((pair) => {
      const [name = '', value = ''] = pair.split(/=(.*)/s)
      return { name, value: decodeURIComponent(value) }
    })
}
