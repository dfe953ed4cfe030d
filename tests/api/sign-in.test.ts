import { query } from '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { decode } from 'next-auth/jwt'
import { GET as me } from '@/app/api/me/route'
import { config } from '@/lib/config'
import { BrowserSession } from '@/tests/support/browser-session'
import { call, problemIn, read } from '@/tests/support/call'
import { newPerson, password } from '@/tests/support/people'
import { User } from '@/models'

const wrong = 'not the password of anybody'

async function whoIs(browser: BrowserSession) {
  return read<{ name: string; role: string } | null>(await call(me, 'GET', { headers: { Cookie: browser.cookie } }))
}

describe('signing in', () => {
  it('lets the right pair in and says who it is', async () => {
    const person = await newPerson('journeyman')
    const browser = new BrowserSession('198.51.100.10')
    expect((await browser.signIn(person.email.toUpperCase(), password)).status).toBe(200)
    expect(await whoIs(browser)).toMatchObject({ name: 'A journeyman', role: 'journeyman' })
  })

  it('keeps nothing in the cookie but the user’s id and the session’s', async () => {
    const person = await newPerson('coordinator')
    const browser = new BrowserSession('198.51.100.11')
    await browser.signIn(person.email, password)
    const token = /longpoint\.session=([^;]+)/.exec(browser.cookie)?.[1] ?? ''
    const claims = await decode({ token, secret: config().AUTH_SECRET })
    expect(Object.keys(claims ?? {}).sort()).toEqual(['exp', 'iat', 'jti', 'signIn', 'sub'])
    expect(claims?.sub).toBe(person.id)
  })

  it('answers a wrong password, an unknown address and a disabled account alike', async () => {
    const known = await newPerson('apprentice')
    const disabled = await newPerson('apprentice')
    await User.update({ disabledAt: new Date() }, { where: { id: disabled.id } })
    const answers = await Promise.all(
      [
        [known.email, wrong],
        ['nobody@test.example', password],
        [disabled.email, password],
      ].map(async ([email = '', tried = ''], n) => {
        const response = await new BrowserSession(`198.51.100.2${n}`).signIn(email, tried)
        return [response.status, await response.text(), response.headers.get('content-type')]
      }),
    )
    expect(answers[0]?.[0]).toBe(401)
    expect(answers[1]).toEqual(answers[0])
    expect(answers[2]).toEqual(answers[0])
  })

  it('makes a new session at each sign-in, and signing out ends the one', async () => {
    const person = await newPerson('journeyman')
    const [phone, desk] = [new BrowserSession('198.51.100.31'), new BrowserSession('198.51.100.32')]
    await phone.signIn(person.email, password)
    await desk.signIn(person.email, password)
    const copied = phone.cookie
    expect((await phone.signOut()).status).toBe(200)
    expect(await whoIs(phone)).toBeNull()
    expect(await read(await call(me, 'GET', { headers: { Cookie: copied } }))).toBeNull()
    expect(await whoIs(desk)).toMatchObject({ role: 'journeyman' })
  })
})

describe('guessing', () => {
  it('stops at ten tries an account, whatever the address, and says how long to wait', async () => {
    const person = await newPerson('journeyman')
    for (let n = 0; n < 10; n++)
      expect((await new BrowserSession(`203.0.113.${n}`).signIn(person.email, wrong)).status).toBe(401)
    const refused = await new BrowserSession('203.0.113.99').signIn(person.email, password)
    expect(refused.status).toBe(429)
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(800)
    expect((await problemIn(refused)).detail).toMatch(/Wait 1[45] minutes/)
  })

  it('lets in again after the window', async () => {
    const person = await newPerson('journeyman')
    for (let n = 0; n < 11; n++) await new BrowserSession(`203.0.113.1${n}`).signIn(person.email, wrong)
    await query('UPDATE rate_limits SET expire = expire - 900000')
    expect((await new BrowserSession('203.0.113.98').signIn(person.email, password)).status).toBe(200)
  })

  it('counts right pairs for nothing', async () => {
    const person = await newPerson('journeyman')
    for (let n = 0; n < 12; n++)
      expect((await new BrowserSession('203.0.113.97').signIn(person.email, password)).status).toBe(200)
  })

  it('stops at fifty tries an address, over any accounts', async () => {
    const browser = new BrowserSession('203.0.113.200')
    const statuses: number[] = []
    for (let n = 0; n < 52; n++) statuses.push((await browser.signIn(`nobody${n}@test.example`, wrong)).status)
    expect(statuses.filter((status) => status === 401)).toHaveLength(50)
    expect(statuses.slice(50)).toEqual([429, 429])
  })
})
