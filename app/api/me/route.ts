import { actorFrom } from '@/lib/http/admit'
import { handle } from '@/lib/http/handle'
import type { Me } from '@/lib/schemas/views'

/** Who is signed in, or null: open pages, which are the same for everybody, ask from the browser. */
export const GET = handle({
  who: 'anyone',
  run: async ({ request }): Promise<Me | null> => {
    const actor = await actorFrom(request)
    return actor && { name: actor.name, role: actor.role, preferences: actor.preferences }
  },
})
