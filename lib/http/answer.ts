/** A route's good answer: a response as it is, an object as JSON, nothing as 204. None is kept by a cache unless it says so. */
export function answerOf(result: object | null | undefined | void, status: number = 200): Response {
  if (result instanceof Response) return result
  const headers = { 'Cache-Control': 'no-store' }
  return result === undefined
    ? new Response(null, { status: 204, headers })
    : Response.json(result, { status, headers })
}
