import { randomUUID } from 'node:crypto'

import { beforeEach, describe, expect, it } from 'vitest'

import { RATE_LIMITS } from '@/lib/auth/constants'
import { findSignedInPerson, type SignedInPerson } from '@/lib/auth/sessions'
import { signIn } from '@/lib/auth/sign-in'
import { NotFoundError, TooManyError } from '@/lib/errors'
import { changeName } from '@/lib/people/change-name'
import { changePassword } from '@/lib/people/change-password'
import { confirmEmailChange } from '@/lib/people/confirm-email-change'
import { endOtherSessions } from '@/lib/people/end-other-sessions'
import { endOwnSession } from '@/lib/people/end-session'
import { presentSession } from '@/lib/people/present'
import { listSessions } from '@/lib/people/queries'
import { requestEmailChange } from '@/lib/people/request-email-change'
import { requestPasswordReset } from '@/lib/people/request-password-reset'
import { resetPassword } from '@/lib/people/reset-password'
import { AccountToken, Activity, Person, Session, type Brand } from '@/models'
import { makeBrand } from '@/tests/factories/brand'
import { makePerson, PASSWORD, signedIn } from '@/tests/factories/person'
import { lettersTo, tokenSentTo } from '@/tests/integration/setup/letters'

const NEW = 'a wether in the lower field'
let brands: Brand[]
let person: Person
let me: SignedInPerson
let other: SignedInPerson
let stranger: SignedInPerson

beforeEach(async () => {
  brands = [await makeBrand(), await makeBrand()]
  person = await makePerson(
    { brand: brands[0]!, role: 'owner' },
    { brand: brands[1]!, role: 'dyer' },
  )
  me = await signedIn(person)
  other = await signedIn(person)
  stranger = await signedIn(await makePerson())
})

const address = () => `${randomUUID()}@people.example`
const isLive = async ({ sessionId }: SignedInPerson) =>
  (await findSignedInPerson(sessionId)) !== null
const enter = (email: string, password: string) =>
  signIn({ email, password, address: randomUUID(), userAgent: '' }).then(({ kind }) => kind)

/** What was recorded in each brand but of signing in, newest last. */
const recorded = () =>
  Promise.all(
    brands.map(async ({ id }) => {
      const rows = await Activity.findAll({
        where: { brandId: id },
        order: [['createdAt', 'ASC']],
        raw: true,
      })
      expect(JSON.stringify(rows)).not.toMatch(/argon2|@|wether|Isla/)
      return rows.map(({ action }) => action).filter((action) => action !== 'session.opened')
    }),
  )

describe('changing the password', () => {
  it('asks for the old one, ends the other sessions, voids links and is told by letter', async () => {
    await requestPasswordReset({ email: person.email }, { address: randomUUID() })
    await changePassword(me, { password: PASSWORD, newPassword: NEW })
    expect([await isLive(me), await isLive(other), await isLive(stranger)]).toEqual([
      true,
      false,
      true,
    ])
    const token = await tokenSentTo(person.email, 'reset-password')
    await expect(resetPassword({ token, password: PASSWORD })).rejects.toThrow(/no longer good/)
    expect((await lettersTo(person.email)).at(-1)!.kind).toBe('password-changed')
    expect(await enter(person.email, NEW)).toBe('opened')
    expect(await recorded()).toEqual([['person.password-changed'], ['person.password-changed']])
  })

  it('with a wrong old one, or to one that would be guessed, changes nothing', async () => {
    await expect(changePassword(me, { password: 'no', newPassword: NEW })).rejects.toMatchObject({
      fieldErrors: { password: [expect.stringMatching(/not your password/)] },
    })
    await expect(
      changePassword(me, { password: PASSWORD, newPassword: 'password1234' }),
    ).rejects.toMatchObject({ fieldErrors: { newPassword: [expect.any(String)] } })
    expect(await isLive(other)).toBe(true)
    expect(await enter(person.email, PASSWORD)).toBe('opened')
    expect(await recorded()).toEqual([[], []])
  })

  it('by somebody at an open session who tries passwords is stopped as at the door', async () => {
    const guess = () => changePassword(me, { password: 'no', newPassword: NEW })
    for (let at = 0; at < RATE_LIMITS['sign-in-account'].points; at++) {
      await expect(guess()).rejects.toMatchObject({ code: 'invalid' })
    }
    await expect(guess()).rejects.toBeInstanceOf(TooManyError)
  })
})

describe('changing the e-mail address', () => {
  it('happens once it is confirmed at the new one, of which the old one is told', async () => {
    const email = address()
    await requestEmailChange(me, { email, password: PASSWORD })
    expect((await Person.findByPk(person.id))!.email).toBe(person.email)
    expect((await lettersTo(person.email)).map(({ kind }) => kind)).toEqual(['email-change-notice'])
    await confirmEmailChange({ token: await tokenSentTo(email, 'change-email') })
    expect(await enter(email, PASSWORD)).toBe('opened')
    expect(await enter(person.email, PASSWORD)).toBe('refused')
    expect((await lettersTo(person.email)).at(-1)!.kind).toBe('email-changed')
    const both = ['person.email-change-requested', 'person.email-changed']
    expect(await recorded()).toEqual([both, both])
  })

  it('needs the password', async () => {
    const email = address()
    await expect(requestEmailChange(me, { email, password: 'no' })).rejects.toMatchObject({
      code: 'invalid',
    })
    expect(await lettersTo(email)).toEqual([])
  })

  it('to one that another account has is answered alike, and never happens', async () => {
    const answers = await Promise.all(
      [stranger.email, address()].map((email) =>
        requestEmailChange(me, { email, password: PASSWORD }),
      ),
    )
    expect(answers[0]).toEqual(answers[1])
    const letters = await lettersTo(stranger.email)
    expect(letters.map(({ kind }) => kind)).toEqual(['email-taken'])
    expect(letters[0]!.text).not.toMatch(/[\w-]{43}/)
  })

  it('by a link works once, and not when a newer one was sent or it is too old', async () => {
    const [first, second] = [address(), address()]
    await requestEmailChange(me, { email: first, password: PASSWORD })
    await requestEmailChange(me, { email: second, password: PASSWORD })
    const dead = /no longer good/
    const old = { token: await tokenSentTo(first, 'change-email') }
    await expect(confirmEmailChange(old)).rejects.toThrow(dead)
    const link = { token: await tokenSentTo(second, 'change-email') }
    const unused = { where: { personId: person.id, usedAt: null } }
    await AccountToken.update({ expiresAt: new Date() }, unused)
    await expect(confirmEmailChange(link)).rejects.toThrow(dead)
    await AccountToken.update({ expiresAt: new Date(Date.now() + 60_000) }, unused)
    await confirmEmailChange(link)
    await expect(confirmEmailChange(link)).rejects.toThrow(dead)
  })

  it('by a link is refused when the address was given an account meanwhile', async () => {
    const email = address()
    await requestEmailChange(me, { email, password: PASSWORD })
    await Person.create({ email, name: 'Quicker', passwordHash: '-' })
    const link = { token: await tokenSentTo(email, 'change-email') }
    await expect(confirmEmailChange(link)).rejects.toMatchObject({ code: 'invalid' })
    expect((await Person.findByPk(person.id))!.email).toBe(person.email)
  })

  it('leaves a link for one thing no good for another', async () => {
    await requestEmailChange(me, { email: address(), password: PASSWORD })
    await requestPasswordReset({ email: person.email }, { address: randomUUID() })
    const token = await tokenSentTo(person.email, 'reset-password')
    await expect(confirmEmailChange({ token })).rejects.toThrow(/no longer good/)
  })
})

describe('changing the name', () => {
  it('is seen at the next request and recorded without either name', async () => {
    await changeName(me, { name: 'Isla Ford' })
    expect((await findSignedInPerson(me.sessionId))!.name).toBe('Isla Ford')
    expect(await recorded()).toEqual([['person.name-changed'], ['person.name-changed']])
  })
})

describe('the list of sessions', () => {
  it('holds one’s own that are live, and says which one asks', async () => {
    await Session.update({ expiresAt: new Date() }, { where: { id: other.sessionId } })
    const sessions = (await listSessions(me)).map((one) => presentSession(one, me.sessionId))
    expect(sessions).toMatchObject([{ id: me.sessionId, current: true, address: '192.0.2.7' }])
  })

  it('ends one of one’s own, and another’s as little as one that does not exist', async () => {
    await endOwnSession(me, { sessionId: other.sessionId })
    expect(await isLive(other)).toBe(false)
    for (const sessionId of [stranger.sessionId, randomUUID()]) {
      await expect(endOwnSession(me, { sessionId })).rejects.toBeInstanceOf(NotFoundError)
    }
    expect(await isLive(stranger)).toBe(true)
    expect(await recorded()).toEqual([['session.ended'], ['session.ended']])
  })

  it('ends all others at once', async () => {
    await signedIn(person)
    expect(await endOtherSessions(me)).toBe(2)
    expect([await isLive(me), await isLive(other), await isLive(stranger)]).toEqual([
      true,
      false,
      true,
    ])
  })
})
