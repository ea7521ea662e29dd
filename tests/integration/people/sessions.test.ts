import { randomUUID } from 'node:crypto'

import { beforeAll, describe, expect, it } from 'vitest'

import { hashPassword } from '@/lib/auth/password'
import { actorIn, endSession, findSignedInPerson, SESSION_IDLE } from '@/lib/auth/sessions'
import { signIn as attempt } from '@/lib/auth/sign-in'
import { Membership, Person, Session } from '@/models'
import { makeBrand } from '@/tests/factories/brand'

const PASSWORD = 'a-long-walk-uphill'
const email = `${randomUUID()}@people.example`

beforeAll(async () => {
  const [first, second] = [await makeBrand('A first brand'), await makeBrand('B second brand')]
  const person = await Person.create({
    email,
    name: 'Two hats',
    passwordHash: await hashPassword(PASSWORD),
  })
  await Membership.create({ brandId: second.id, personId: person.id, role: 'dyer' })
  await Membership.create({ brandId: first.id, personId: person.id, role: 'owner' })
})

const from = (address: string = randomUUID()) => ({ address, userAgent: 'a test' })

async function signIn() {
  const outcome = await attempt({ email, password: PASSWORD, ...from() })
  if (outcome.kind !== 'opened') throw new Error(outcome.kind)
  return outcome
}

describe('signing in', () => {
  it('opens a session that finds the person, with a role in each of their brands', async () => {
    const { sessionId } = await signIn()
    const person = await findSignedInPerson(sessionId)
    expect(person).toMatchObject({ name: 'Two hats', email, sessionId })
    expect(person!.memberships.map(({ brandName, role }) => [brandName, role])).toEqual([
      ['A first brand', 'owner'],
      ['B second brand', 'dyer'],
    ])
  })

  it('refuses a wrong password and an unknown address alike', async () => {
    const wrong = { email, password: `${PASSWORD}!`, ...from() }
    const unknown = { email: 'nobody@people.example', password: PASSWORD, ...from() }
    expect(await attempt(wrong)).toEqual({ kind: 'refused' })
    expect(await attempt(unknown)).toEqual({ kind: 'refused' })
  })

  it('never hands out the password hash with a session', async () => {
    const { sessionId } = await signIn()
    expect(JSON.stringify(await findSignedInPerson(sessionId))).not.toContain('argon2')
  })
})

describe('a session', () => {
  it('is over once it is ended, and ending it twice is no error', async () => {
    const { sessionId } = await signIn()
    await endSession(sessionId)
    await endSession(sessionId)
    expect(await findSignedInPerson(sessionId)).toBeNull()
  })

  it('is over after its lifetime', async () => {
    const { sessionId } = await signIn()
    await Session.update({ expiresAt: new Date(Date.now() - 1) }, { where: { id: sessionId } })
    expect(await findSignedInPerson(sessionId)).toBeNull()
  })

  it('is over after its idle time, and a request puts that off', async () => {
    const { sessionId } = await signIn()
    const almost = new Date(Date.now() - SESSION_IDLE + 60_000)
    await Session.update({ lastSeenAt: almost }, { where: { id: sessionId } })
    expect(await findSignedInPerson(sessionId)).not.toBeNull()
    const seen = await Session.findByPk(sessionId, { rejectOnEmpty: true })
    expect(seen.lastSeenAt.getTime()).toBeGreaterThan(almost.getTime())
    await Session.update(
      { lastSeenAt: new Date(Date.now() - SESSION_IDLE - 1) },
      { where: { id: sessionId } },
    )
    expect(await findSignedInPerson(sessionId)).toBeNull()
  })

  it('gives no actor in a brand the person does not belong to, known or unknown', async () => {
    const { sessionId } = await signIn()
    const person = (await findSignedInPerson(sessionId))!
    const other = await makeBrand()
    expect(actorIn(person, other.slug)).toBeNull()
    expect(actorIn(person, 'no-such-brand')).toBeNull()
  })
})
