import { BadRequest } from './problem'

/** More than any form of ours; photos have a route of their own. */
export const bodyLimitBytes = 64 * 1024

const tooLarge = () => new BadRequest(413, `A body has at most ${bodyLimitBytes / 1024} KB.`)

/** Reads the body as text and stops at the limit, whatever length was announced. @throws BadRequest 400, 413 */
export async function readText(request: Request): Promise<string> {
  if (Number(request.headers.get('content-length')) > bodyLimitBytes) throw tooLarge()
  const parts: Uint8Array[] = []
  let length = 0
  const reader = request.body?.getReader()
  for (let read = await reader?.read(); read && !read.done; read = await reader?.read()) {
    length += read.value.byteLength
    if (length > bodyLimitBytes) {
      await reader?.cancel()
      throw tooLarge()
    }
    parts.push(read.value)
  }
  return decoded(Buffer.concat(parts))
}

/** Bytes that are no UTF-8 would come back as other characters, so they are refused. */
function decoded(bytes: Uint8Array): string {
  try {
    return new TextDecoder('utf-8', { fatal: true, ignoreBOM: true }).decode(bytes)
  } catch {
    throw new BadRequest(400, 'The body is not UTF-8.')
  }
}

/** Reads a JSON body; an empty one is undefined. @throws BadRequest 400, 413, 415 */
export function parseJson(request: Request, text: string): unknown {
  if (text === '') return undefined
  const type = request.headers.get('content-type') ?? ''
  if (!/^application\/json\b/i.test(type)) throw new BadRequest(415, 'Send JSON, with Content-Type application/json.')
  try {
    return JSON.parse(text)
  } catch {
    throw new BadRequest(400, 'The body is not JSON.')
  }
}
