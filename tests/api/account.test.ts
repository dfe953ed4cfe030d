import '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { POST as changePassword } from '@/app/api/account/password/route'
import { PATCH as prefer } from '@/app/api/account/preferences/route'
import { GET as account } from '@/app/api/account/route'
import { GET as me } from '@/app/api/me/route'
import { POST as start } from '@/app/api/start/route'
import { Actor } from '@/lib/auth/actor'
import { openSignIn } from '@/lib/data/sign-ins'
import type { Account, Me } from '@/lib/schemas/views'
import { AuditEvent, OutboxLetter, User } from '@/models'
import { BrowserSession } from '@/tests/support/browser-session'
import { call, problemIn, read } from '@/tests/support/call'
import { newPerson, password } from '@/tests/support/people'

const fresh = 'gravel pocket tuba lichen'

describe('/start', () => {
  const form = { name: 'Lene Haug', shop: 'Haug Rail', email: 'Lene@Test.example', password: fresh }

  it('opens a shop whose journeyman can sign in at once', async () => {
    expect(
      (await call(start, 'POST', { body: { ...form, role: 'coordinator', shopId: 'x', demo: true } })).status,
    ).toBe(201)
    const browser = new BrowserSession()
    expect((await browser.signIn('lene@test.example', fresh)).status).toBe(200)
    expect(await read(await call(me, 'GET', { headers: { Cookie: browser.cookie } }))).toMatchObject({
      name: 'Lene Haug',
      role: 'journeyman',
    })
    expect(await User.findOne({ where: { email: 'lene@test.example' }, raw: true })).toMatchObject({ demo: 0 })
  })

  it('opens none for an address that has an account', async () => {
    const response = await call(start, 'POST', { body: { ...form, email: 'LENE@test.example' } })
    expect((await problemIn(response)).errors?.map(({ field }) => field)).toEqual(['email'])
  })

  it('refuses a password that names the person', async () => {
    const response = await call(start, 'POST', {
      body: { ...form, email: 'other@test.example', password: 'haug rail lene haug' },
    })
    expect((await problemIn(response)).errors?.map(({ field }) => field)).toEqual(['password'])
  })
})

describe('preferences', () => {
  it('change in what is named, nothing else', async () => {
    const person = await newPerson('apprentice')
    const forged = { role: 'coordinator', shopId: 'x', passwordHash: 'x', email: 'x', version: 9, disabledAt: 'x' }
    const answer = await call(prefer, 'PATCH', { as: person, body: { units: 'mm', dialStep: 0.5, ...forged } })
    const preferences = { units: 'mm', tape: 16, sawSquare: 0, dialStep: 0.5, theme: 'system' }
    expect(await read(answer)).toEqual(preferences)
    expect(await read<Me>(await call(me, 'GET', { as: person }))).toEqual({
      name: 'A apprentice',
      role: 'apprentice',
      preferences,
    })
    expect(await User.findByPk(person.id, { raw: true })).toMatchObject({
      email: person.email,
      version: 1,
      disabledAt: null,
    })
  })

  it('that there are not are refused', async () => {
    const person = await newPerson('apprentice')
    const response = await call(prefer, 'PATCH', { as: person, body: { tape: 7, sawSquare: 45, theme: 'pink' } })
    expect((await problemIn(response)).errors?.map(({ field }) => field)).toEqual(['tape', 'sawSquare', 'theme'])
  })

  it('left unnamed change nothing', async () => {
    const person = await newPerson('apprentice')
    expect((await call(prefer, 'PATCH', { as: person, body: {} })).status).toBe(200)
  })
})

describe('an account', () => {
  it('shows its own sessions and says which is this one', async () => {
    const person = await newPerson('instructor')
    await openSignIn(person.id, 'Phone')
    const shown = await read<Account>(await call(account, 'GET', { as: person }))
    expect(shown).toMatchObject({ email: person.email, shop: 'Test shop', role: 'instructor' })
    expect(shown.signIns.map(({ agent, thisOne }) => [agent, thisOne]).sort()).toEqual([
      ['Phone', false],
      ['test', true],
    ])
    expect(JSON.stringify(shown)).not.toMatch(/argon2|passwordHash/)
  })
})

describe('a changed password', () => {
  const change = (as: Awaited<ReturnType<typeof newPerson>>, body: object) => call(changePassword, 'POST', { as, body })

  it('lets in from then on, the old one no more, and ends the other sessions', async () => {
    const person = await newPerson('journeyman')
    const elsewhere = await openSignIn(person.id, 'elsewhere')
    expect((await change(person, { currentPassword: password, password: fresh })).status).toBe(204)
    expect((await new BrowserSession().signIn(person.email, password)).status).toBe(401)
    expect((await new BrowserSession().signIn(person.email, fresh)).status).toBe(200)
    expect(await Actor.of(elsewhere, person.id)).toBeNull()
    expect(await Actor.of(person.signIn, person.id)).not.toBeNull()
    expect(await AuditEvent.count({ where: { subjectId: person.id, action: 'password.changed' } })).toBe(1)
    const letters = await OutboxLetter.findAll({ where: { recipient: person.email }, raw: true })
    expect(letters).toMatchObject([{ kind: 'password-changed', attempts: 0, sentAt: null }])
  })

  it('needs the present one, which cannot be guessed at for long', async () => {
    const person = await newPerson('journeyman')
    const wrong = { currentPassword: 'not this one at all', password: fresh }
    const statuses: number[] = []
    for (let n = 0; n < 11; n++) statuses.push((await change(person, wrong)).status)
    expect(statuses).toEqual([...Array(10).fill(422), 429])
  })

  it.each(['short', 'password password', 'aaaaaaaaaaaaaaaaaaaa', 'x'.repeat(129)])(
    'is refused when guessed early: %s',
    async (weak) => {
      const person = await newPerson('journeyman')
      const response = await change(person, { currentPassword: password, password: weak })
      expect((await problemIn(response)).errors?.map(({ field }) => field)).toEqual(['password'])
    },
  )
})
