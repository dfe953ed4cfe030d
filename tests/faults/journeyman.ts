import { randomUUID } from 'node:crypto'
import { setTimeout as wait } from 'node:timers/promises'

const patienceMs = 10_000

/** Somebody with a job book, who talks to the app as the browser does. */
export class Journeyman {
  #cookies = new Map<string, string>()

  private constructor(readonly origin: string) {}

  /** Opens a one-person shop and signs in. */
  static async at(origin: string): Promise<Journeyman> {
    const person = new Journeyman(origin)
    const email = `${randomUUID()}@steel.example`
    const password = 'nine wet anvils in a row'
    const opened = await person.post('/api/start', randomUUID(), {
      name: 'Ansel Rook',
      shop: 'Rook Iron',
      email,
      password,
    })
    if (opened.status !== 201) throw new Error(`the shop was not opened: ${opened.status} ${await opened.text()}`)
    await person.#signIn(email, password)
    return person
  }

  /** Ask for a job to be made. The key makes a repeat of the same request safe. */
  makeJob(name: string, key: string, notes = ''): Promise<Response> {
    return this.post('/api/jobs', key, { name, notes })
  }

  /** The same request until it is acknowledged. Throws when `tries` were not enough. */
  async insist(name: string, key: string, tries: number): Promise<string> {
    for (let tried = 0; tried < tries; tried++) {
      const id = await this.#acknowledged(name, key)
      if (id) return id
      await wait(100)
    }
    throw new Error(`${name} was not acknowledged in ${tries} tries`)
  }

  async #acknowledged(name: string, key: string): Promise<string | undefined> {
    try {
      const answer = await this.makeJob(name, key)
      if (answer.status === 201) return ((await answer.json()) as { id: string }).id
    } catch {
      // Nobody listens, or the answer was cut off: the caller asks again.
    }
    return undefined
  }

  async post(path: string, key: string, body: object): Promise<Response> {
    return this.#request(path, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'idempotency-key': key },
      body: JSON.stringify(body),
    })
  }

  async #signIn(email: string, password: string) {
    const { csrfToken } = (await (await this.#request('/api/auth/csrf', {})).json()) as { csrfToken: string }
    const body = new URLSearchParams({ csrfToken, email, password, json: 'true' })
    await this.#request('/api/auth/callback/credentials', { method: 'POST', body })
    const me = await this.makeJob('First job', randomUUID())
    if (me.status !== 201) throw new Error(`the sign-in did not hold: ${me.status} ${await me.text()}`)
  }

  async #request(path: string, init: RequestInit): Promise<Response> {
    const cookie = [...this.#cookies].map(([name, value]) => `${name}=${value}`).join('; ')
    const headers = { origin: this.origin, cookie, ...init.headers }
    const signal = AbortSignal.timeout(patienceMs)
    const response = await fetch(this.origin + path, { ...init, headers, signal, redirect: 'manual' })
    for (const set of response.headers.getSetCookie()) {
      const [name = '', value = ''] = set.split(';')[0]?.split(/=(.*)/) ?? []
      this.#cookies.set(name, value)
    }
    return response
  }
}
