type Handler<Context> = (request: Request, context: Context) => Promise<Response>

/** Lets pages of other sites read what this route answers, refusals included. For routes that know no session. */
export function openToAll<Context>(handler: Handler<Context>): Handler<Context> {
  return async (request, context) => {
    const response = await handler(request, context)
    response.headers.set('Access-Control-Allow-Origin', '*')
    response.headers.set('Cross-Origin-Resource-Policy', 'cross-origin')
    return response
  }
}

/** Answers a browser that asks before it calls across sites. */
export function preflight(methods: string) {
  return async () =>
    new Response(null, {
      status: 204,
      headers: {
        'Access-Control-Allow-Origin': '*',
        'Access-Control-Allow-Methods': methods,
        'Access-Control-Allow-Headers': 'Content-Type',
        'Access-Control-Max-Age': '86400',
      },
    })
}

/** JSON that a cache may keep: descriptions change with a release only. */
export const described = (body: object) => Response.json(body, { headers: { 'Cache-Control': 'public, max-age=300' } })
