import '@/tests/support/database'
import { describe, expect, it } from 'vitest'
import { DELETE as endOthers } from '@/app/api/account/sign-ins/route'
import { GET as account } from '@/app/api/account/route'
import { GET as jobs } from '@/app/api/jobs/route'
import { GET as me } from '@/app/api/me/route'
import { Actor } from '@/lib/auth/actor'
import { endSignIn, openSignIn } from '@/lib/data/sign-ins'
import { SignIn, User } from '@/models'
import { call, problemIn, read } from '@/tests/support/call'
import { cookieFor, joinCrew, newPerson } from '@/tests/support/people'

describe('a session', () => {
  it('opens nothing at the next request once it has ended', async () => {
    const person = await newPerson('journeyman')
    expect((await call(jobs, 'GET', { as: person })).status).toBe(200)
    await endSignIn(person.signIn, person.id)
    const refused = await call(jobs, 'GET', { as: person })
    expect(refused.status).toBe(401)
    expect((await problemIn(refused)).title).toBe('Sign in first')
  })

  it('opens nothing at the next request once its person is disabled', async () => {
    const person = await newPerson('journeyman')
    await User.update({ disabledAt: new Date() }, { where: { id: person.id } })
    expect((await call(jobs, 'GET', { as: person })).status).toBe(401)
    expect(await read(await call(me, 'GET', { as: person }))).toBeNull()
  })

  it('has the new role at the next request once it was changed', async () => {
    const person = await newPerson('journeyman')
    await User.update({ role: 'apprentice' }, { where: { id: person.id } })
    expect((await call(jobs, 'GET', { as: person })).status).toBe(403)
    expect(await read(await call(me, 'GET', { as: person }))).toMatchObject({ role: 'apprentice' })
  })

  it('is nobody’s with a forged, foreign or broken cookie', async () => {
    const [one, other] = [await newPerson('journeyman'), await newPerson('journeyman')]
    const cookies = [
      await cookieFor(one.id, other.signIn),
      await cookieFor(one.id, 'not-a-session'),
      `${one.cookie}x`,
      'longpoint.session=',
      'longpoint.session=%00%ff',
    ]
    for (const Cookie of cookies) expect((await call(jobs, 'GET', { headers: { Cookie } })).status).toBe(401)
  })

  it('can be ended everywhere but here', async () => {
    const person = await newPerson('apprentice')
    const elsewhere = await openSignIn(person.id, 'elsewhere')
    const stranger = await newPerson('apprentice')
    expect(await read(await call(endOthers, 'DELETE', { as: person }))).toEqual({ ended: 1 })
    expect(await Actor.of(elsewhere, person.id)).toBeNull()
    expect(await Actor.of(person.signIn, person.id)).not.toBeNull()
    expect(await Actor.of(stranger.signIn, stranger.id)).not.toBeNull()
  })

  it('carries the crews that stand in the database', async () => {
    const person = await newPerson('instructor')
    const crews = [await joinCrew(person, 'instructor'), await joinCrew(person, 'instructor')]
    const actor = await Actor.of(person.signIn, person.id)
    expect([...(actor?.crewIds ?? [])].sort()).toEqual(crews.sort())
  })

  it('notes when it was last used, not at every request', async () => {
    const person = await newPerson('apprentice')
    const long = new Date(Date.now() - 3600_000)
    await SignIn.update({ lastSeenAt: long }, { where: { id: person.signIn } })
    await call(account, 'GET', { as: person })
    const seen = async () => (await SignIn.findByPk(person.signIn))?.lastSeenAt.getTime() ?? 0
    const first = await seen()
    expect(Date.now() - first).toBeLessThan(60_000)
    await call(account, 'GET', { as: person })
    expect(await seen()).toBe(first)
  })
})
