import { randomUUID } from 'node:crypto'

import { TOTP } from 'otpauth'
import { beforeEach, describe, expect, it } from 'vitest'

import { RATE_LIMITS } from '@/lib/auth/constants'
import { digest } from '@/lib/auth/seal'
import { makeTotpSecret } from '@/lib/auth/second-factor'
import { findSignedInPerson } from '@/lib/auth/sessions'
import { signIn } from '@/lib/auth/sign-in'
import { TooManyError } from '@/lib/errors'
import { requestEmailChange } from '@/lib/people/request-email-change'
import { requestPasswordReset } from '@/lib/people/request-password-reset'
import { resetPassword } from '@/lib/people/reset-password'
import { confirmEmailChange } from '@/lib/people/confirm-email-change'
import { AccountToken, Activity, type Brand, type Person } from '@/models'
import { makeBrand } from '@/tests/factories/brand'
import { makePerson, PASSWORD, signedIn } from '@/tests/factories/person'
import { lettersTo, tokenSentTo } from '@/tests/integration/setup/letters'

const NEW = 'a wether in the lower field'
let brands: Brand[]
let person: Person

beforeEach(async () => {
  brands = [await makeBrand(), await makeBrand()]
  person = await makePerson(
    { brand: brands[0]!, role: 'owner' },
    { brand: brands[1]!, role: 'dyer' },
  )
})

const request = (email = person.email, address: string = randomUUID()) =>
  requestPasswordReset({ email }, { address })
const token = () => tokenSentTo(person.email, 'reset-password')
const enter = (password: string, code?: string) =>
  signIn({ email: person.email, password, code, address: randomUUID(), userAgent: '' })
const DEAD = /no longer good/

describe('a forgotten password', () => {
  it('is replaced by the link of a letter, which begins with our own address', async () => {
    await request()
    const [letter] = await lettersTo(person.email)
    expect(letter!.text).toContain(`${process.env.APP_ORIGIN}/reset-password/${await token()}`)
    await resetPassword({ token: await token(), password: NEW })
    expect((await enter(PASSWORD)).kind).toBe('refused')
    expect((await enter(NEW)).kind).toBe('opened')
  })

  it('leaves only a hash of the token in the database, good for 30 minutes', async () => {
    await request()
    const row = await AccountToken.findOne({ where: { personId: person.id }, rejectOnEmpty: true })
    expect(row.tokenHash).toBe(digest(await token()))
    const minutes = (row.expiresAt.getTime() - Date.now()) / 60_000
    expect(minutes).toBeGreaterThan(29)
    expect(minutes).toBeLessThanOrEqual(30)
  })

  it('is replaced once by a link, also by two at the same moment', async () => {
    await request()
    const input = { token: await token(), password: NEW }
    const outcomes = await Promise.allSettled([resetPassword(input), resetPassword(input)])
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    await expect(resetPassword(input)).rejects.toThrow(DEAD)
  })

  it('is not replaced by a link that is too old, or followed by a newer one, or made up', async () => {
    await request()
    const first = await token()
    await request()
    await expect(resetPassword({ token: first, password: NEW })).rejects.toThrow(DEAD)
    await AccountToken.update({ expiresAt: new Date() }, { where: { personId: person.id } })
    await expect(resetPassword({ token: await token(), password: NEW })).rejects.toThrow(DEAD)
    await expect(resetPassword({ token: 'x'.repeat(43), password: NEW })).rejects.toThrow(DEAD)
    expect((await enter(PASSWORD)).kind).toBe('opened')
  })

  it('is not replaced by one that would be guessed, and the link stays good', async () => {
    await request()
    const weak = { token: await token(), password: 'Isla Farrow 2026' }
    await expect(resetPassword(weak)).rejects.toMatchObject({
      code: 'invalid',
      fieldErrors: { password: [expect.stringMatching(/first passwords/)] },
    })
    await resetPassword({ token: await token(), password: NEW })
  })

  it('once replaced ends every session, voids every other link, and is told by letter', async () => {
    const one = await signedIn(person)
    const other = await signedIn(person)
    const bystander = await signedIn(await makePerson())
    const newEmail = `${randomUUID()}@people.example`
    await requestEmailChange(one, { email: newEmail, password: PASSWORD })
    await request()
    await resetPassword({ token: await token(), password: NEW })
    expect(await findSignedInPerson(one.sessionId)).toBeNull()
    expect(await findSignedInPerson(other.sessionId)).toBeNull()
    expect(await findSignedInPerson(bystander.sessionId)).not.toBeNull()
    const emailToken = await tokenSentTo(newEmail, 'change-email')
    await expect(confirmEmailChange({ token: emailToken })).rejects.toThrow(DEAD)
    expect((await lettersTo(person.email)).at(-1)!.kind).toBe('password-changed')
  })

  it('stands in the record of each of the brands, without any secret', async () => {
    await request()
    await resetPassword({ token: await token(), password: NEW })
    for (const { id } of brands) {
      const rows = await Activity.findAll({ where: { brandId: id }, raw: true })
      expect(rows).toMatchObject([{ action: 'person.password-reset', personId: person.id }])
      expect(JSON.stringify(rows)).not.toMatch(/argon2|wether|@/)
    }
  })

  it('does not take the second factor away', async () => {
    const { sealed, secret } = makeTotpSecret(person.email)
    await person.update({ totpSecret: sealed, totpConfirmedAt: new Date() })
    await request()
    await resetPassword({ token: await token(), password: NEW })
    expect((await enter(NEW)).kind).toBe('code-wanted')
    expect((await enter(NEW, new TOTP({ secret }).generate())).kind).toBe('opened')
  })

  it('can be replaced although others have closed the account by wrong ones', async () => {
    for (let at = 0; at < RATE_LIMITS['sign-in-account'].points; at++) await enter('no')
    expect((await enter(PASSWORD)).kind).toBe('too-many')
    await request()
    await resetPassword({ token: await token(), password: NEW })
    expect((await enter(NEW)).kind).toBe('opened')
  })

  it('of nobody is answered alike, and the letter says so', async () => {
    const email = `${randomUUID()}@people.example`
    expect(await request(email)).toEqual(await request())
    expect((await lettersTo(email)).map(({ kind }) => kind)).toEqual(['no-account'])
  })

  it('can be asked for so often by address, whether it exists or not, and so often from one place', async () => {
    for (const email of [person.email, `${randomUUID()}@people.example`]) {
      for (let at = 0; at < RATE_LIMITS['reset-email'].points; at++) await request(email)
      await expect(request(email)).rejects.toBeInstanceOf(TooManyError)
    }
    const place = randomUUID()
    const anybody = () => request(`${randomUUID()}@people.example`, place)
    for (let at = 0; at < RATE_LIMITS['reset-address'].points; at++) await anybody()
    await expect(anybody()).rejects.toBeInstanceOf(TooManyError)
  })
})
