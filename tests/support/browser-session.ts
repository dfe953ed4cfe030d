import { GET, POST } from '@/app/api/auth/[...nextauth]/route'
import { origin, read } from './call'
import { underWay } from './request-scope'

/** What a browser does at the sign-in: it keeps cookies and carries the token back. */
export class BrowserSession {
  #cookies = new Map<string, string>()

  constructor(readonly address = '198.51.100.1') {}

  get cookie(): string {
    return [...this.#cookies].map(([name, value]) => `${name}=${value}`).join('; ')
  }

  async signIn(email: string, password: string): Promise<Response> {
    return this.#post(['callback', 'credentials'], { email, password })
  }

  async signOut(): Promise<Response> {
    return this.#post(['signout'], {})
  }

  async #post(place: string[], fields: { [name: string]: string }): Promise<Response> {
    const { csrfToken } = await read<{ csrfToken: string }>(await this.#send('GET', ['csrf']))
    return this.#send('POST', place, new URLSearchParams({ ...fields, csrfToken, json: 'true' }))
  }

  async #send(method: 'GET' | 'POST', place: string[], body?: URLSearchParams): Promise<Response> {
    const headers = {
      Cookie: this.cookie,
      Origin: origin,
      'x-longpoint-address': this.address,
      'User-Agent': 'Test browser',
    }
    const url = `${origin}/api/auth/${place.join('/')}`
    const request = new Request(url, { method, headers, ...(body === undefined ? {} : { body }) })
    const handler = method === 'GET' ? GET : POST
    const context = { params: Promise.resolve({ nextauth: place }) }
    const response = await underWay(request, () => handler(request, context))
    for (const line of response.headers.getSetCookie()) this.#keep(line)
    return response
  }

  #keep(line: string) {
    const [pair = ''] = line.split(';')
    const name = pair.slice(0, pair.indexOf('='))
    const value = pair.slice(pair.indexOf('=') + 1)
    if (value === '' || /max-age=0/i.test(line)) this.#cookies.delete(name)
    else this.#cookies.set(name, value)
  }
}
