import NextAuth from 'next-auth'
import { NextRequest } from 'next/server'
import { atTheDoor } from '@/lib/auth/door'
import { authOptions } from '@/lib/auth/options'
import { NotFound } from '@/lib/errors'
import { readText } from '@/lib/http/body'
import { addressOf } from '@/lib/http/client-address'
import { handle } from '@/lib/http/handle'
import { z } from '@/lib/schemas/zod'

// Only what our screens use; next-auth's own pages and its session route stay shut.
const opened: { [method: string]: readonly string[] } = { GET: ['csrf'], POST: ['callback', 'signout'] }

const door = handle({
  who: 'anyone',
  params: z.object({ nextauth: z.array(z.string()).min(1) }),
  run: async ({ request, params }) => {
    if (!opened[request.method]?.includes(params.nextauth[0] ?? '')) throw new NotFound()
    const { url, method, headers } = request
    const body = method === 'POST' ? await readText(request) : undefined
    const copy = new NextRequest(url, { method, headers, ...(body === undefined ? {} : { body }) })
    const caller = { address: addressOf(request), agent: headers.get('user-agent') ?? '' }
    return atTheDoor(caller, () => NextAuth(copy, { params: Promise.resolve(params) }, authOptions()))
  },
})

export { door as GET, door as POST }
