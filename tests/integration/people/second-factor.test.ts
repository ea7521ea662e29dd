import { randomUUID } from 'node:crypto'

import { TOTP } from 'otpauth'
import sharp from 'sharp'
import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { hashPassword } from '@/lib/auth/password'
import { RATE_LIMITS } from '@/lib/auth/constants'
import { digest, unseal } from '@/lib/auth/seal'
import { RECOVERY_CODES } from '@/lib/auth/second-factor'
import { findSignedInPerson, type SignedInPerson } from '@/lib/auth/sessions'
import { signIn } from '@/lib/auth/sign-in'
import { ConflictError, InvalidError, TooManyError } from '@/lib/errors'
import { beginSecondFactor } from '@/lib/people/begin-second-factor'
import { confirmSecondFactor } from '@/lib/people/confirm-second-factor'
import { getSecondFactor } from '@/lib/people/get-second-factor'
import { removeSecondFactor } from '@/lib/people/remove-second-factor'
import { renewRecoveryCodes } from '@/lib/people/renew-recovery-codes'
import { Activity, type Brand, Letter, Membership, Person, RecoveryCode } from '@/models'
import { withinScope } from '@/models/scope'
import { makeBrand } from '@/tests/factories/brand'

const password = 'a-long-walk-uphill'
let passwordHash: string
let email: string
let brands: Brand[]
let person: SignedInPerson

beforeAll(async () => {
  passwordHash = await hashPassword(password)
})
beforeEach(async () => {
  email = `${randomUUID()}@people.example`
  const { id } = await Person.create({ email, name: 'Somebody', passwordHash })
  brands = [await makeBrand('A first brand'), await makeBrand('B second brand')]
  for (const { id: brandId } of brands) {
    await Membership.create({ brandId, personId: id, role: 'designer' })
  }
  person = await signInAgain()
})

const attempt = (code?: string) =>
  signIn({ email, password, code, address: randomUUID(), userAgent: 'a test' })

async function signInAgain(code?: string): Promise<SignedInPerson> {
  const outcome = await attempt(code)
  if (outcome.kind !== 'opened') throw new Error(outcome.kind)
  return (await findSignedInPerson(outcome.sessionId))!
}

/** As an action runs a command of the signed-in person. */
const as = <T>(work: () => Promise<T>) => withinScope({ personId: person.id }, work)
const begin = (code?: string) => as(() => beginSecondFactor(person, { password, code }))
const confirm = (code: string) => as(() => confirmSecondFactor(person, { code }))
const remove = (code: string) => as(() => removeSecondFactor(person, { password, code }))
const renew = (code: string) => as(() => renewRecoveryCodes(person, { password, code }))

/** Sets a second factor up and answers with its authenticator; the code of now is still unused. */
async function setUp(): Promise<{ totp: TOTP; recoveryCodes: string[] }> {
  const { uri } = await begin()
  const totp = new TOTP({ secret: new URL(uri).searchParams.get('secret')! })
  const earlier = () => confirm(totp.generate({ timestamp: Date.now() - 30_000 }))
  // Once more where a step ended in between.
  const { recoveryCodes } = await earlier().catch(earlier)
  person = (await findSignedInPerson(person.sessionId))!
  return { totp, recoveryCodes }
}

const rowOf = () => Person.unscoped().findByPk(person.id, { rejectOnEmpty: true })
const actionsIn = async (brandId: string) =>
  (await Activity.findAll({ where: { brandId }, order: [['createdAt', 'ASC']] }))
    .map(({ action }) => action)
    .filter((action) => !action.startsWith('session.'))
const lettersTo = async () => {
  const letters = await Letter.findAll({
    where: { recipient: email },
    order: [['createdAt', 'ASC']],
  })
  return letters.map(({ kind, sealedBody }) => ({ kind, text: unseal(sealedBody, 'letter') }))
}
const settled = <T>(work: Promise<T>) =>
  work.then(
    () => 'done' as const,
    (error: Error) => error.name,
  )

describe('beginning a second factor', () => {
  it('needs the password, gives the secret in groups of four, as an address and as a picture', async () => {
    await expect(
      as(() => beginSecondFactor(person, { password: 'another one' })),
    ).rejects.toBeInstanceOf(InvalidError)
    expect((await rowOf()).totpPending).toBeNull()
    const { secret, uri, picture } = await begin()
    expect(secret).toMatch(/^([A-Z2-7]{4} ){7}[A-Z2-7]{4}$/)
    expect(new URL(uri).searchParams.get('secret')).toBe(secret.replaceAll(' ', ''))
    const svg = Buffer.from(picture.replace('data:image/svg+xml;base64,', ''), 'base64')
    const { data, info } = await sharp(svg).resize(600).raw().toBuffer({ resolveWithObject: true })
    expect(info).toMatchObject({ width: 600, height: 600 })
    // Dark on light, with a quiet zone around it.
    expect([...data.subarray(0, 3)]).toEqual([255, 255, 255])
    expect(data.some((value) => value === 0)).toBe(true)
  })

  it('keeps the secret sealed, and asks for no code at sign-in before it is confirmed', async () => {
    const { secret } = await begin()
    const { totpPending } = await rowOf()
    expect(totpPending).not.toContain(secret.replaceAll(' ', ''))
    expect((await attempt()).kind).toBe('opened')
    expect(await getSecondFactor(person)).toMatchObject({ inUse: false, begun: true })
  })

  it('counts wrong passwords as the sign-in does, and right ones not', async () => {
    const { points } = RATE_LIMITS['sign-in-account']
    for (let at = 0; at < points * 2; at++) await begin()
    const wrong = () => as(() => beginSecondFactor(person, { password: 'no' }))
    for (let at = 0; at < points; at++) await expect(wrong()).rejects.toBeInstanceOf(InvalidError)
    await expect(begin()).rejects.toBeInstanceOf(TooManyError)
    expect((await attempt()).kind).toBe('too-many')
  })
})

describe('confirming a second factor', () => {
  it('takes a code of the last one begun, and no other', async () => {
    const first = await begin()
    const second = await begin()
    const codeOf = ({ uri }: { uri: string }) =>
      new TOTP({ secret: new URL(uri).searchParams.get('secret')! }).generate()
    await expect(confirm(codeOf(first))).rejects.toBeInstanceOf(InvalidError)
    expect((await confirm(codeOf(second))).recoveryCodes).toHaveLength(RECOVERY_CODES)
  })

  it('leaves the session open, and lets the code that confirmed not sign in', async () => {
    const { uri } = await begin()
    const code = new TOTP({ secret: new URL(uri).searchParams.get('secret')! }).generate()
    await confirm(code)
    expect(await findSignedInPerson(person.sessionId)).toMatchObject({ hasSecondFactor: true })
    expect((await attempt()).kind).toBe('code-wanted')
    expect((await attempt(code)).kind).toBe('code-refused')
  })

  it('is done once of two requests with the same code at the same moment', async () => {
    const { uri } = await begin()
    const code = new TOTP({ secret: new URL(uri).searchParams.get('secret')! }).generate()
    const outcomes = await Promise.all([settled(confirm(code)), settled(confirm(code))])
    expect(outcomes.sort()).toEqual(['ConflictError', 'done'])
    expect(await RecoveryCode.count({ where: { personId: person.id } })).toBe(RECOVERY_CODES)
  })

  it('keeps recovery codes as nothing that could be tried without the product’s key', async () => {
    const { recoveryCodes } = await setUp()
    expect(new Set(recoveryCodes).size).toBe(RECOVERY_CODES)
    for (const code of recoveryCodes) expect(code).toMatch(/^[2-9a-z]{5}-[2-9a-z]{5}$/)
    const hashes = await RecoveryCode.findAll({ where: { personId: person.id } })
    const bare = new Set(recoveryCodes.map((code) => digest(code.replace('-', ''))))
    expect(hashes.some(({ codeHash }) => bare.has(codeHash))).toBe(false)
  })

  it('stands in the record of each of their brands and goes out by letter, without a secret', async () => {
    const { totp, recoveryCodes } = await setUp()
    for (const { id } of brands) expect(await actionsIn(id)).toEqual(['person.second-factor-set'])
    const letters = await lettersTo()
    expect(letters.map(({ kind }) => kind)).toEqual(['second-factor-set'])
    for (const secret of [totp.secret.base32, ...recoveryCodes]) {
      expect(letters[0]!.text).not.toContain(secret)
    }
  })

  it('has nothing to confirm before a beginning, and after the end', async () => {
    await expect(confirm('123456')).rejects.toBeInstanceOf(ConflictError)
    const { totp } = await setUp()
    await expect(confirm(totp.generate())).rejects.toBeInstanceOf(ConflictError)
  })
})

describe('changing the authenticator', () => {
  it('needs a code of the one in use, which stays in use until the new one is confirmed', async () => {
    const { totp, recoveryCodes } = await setUp()
    await expect(begin()).rejects.toBeInstanceOf(InvalidError)
    await expect(begin('000000')).rejects.toBeInstanceOf(InvalidError)
    const { uri } = await begin(recoveryCodes[0])
    expect((await attempt(totp.generate())).kind).toBe('opened')
    const next = new TOTP({ secret: new URL(uri).searchParams.get('secret')! })
    await confirm(next.generate())
    const later = { timestamp: Date.now() + 30_000 }
    expect((await attempt(totp.generate(later))).kind).toBe('code-refused')
    expect((await attempt(recoveryCodes[1])).kind).toBe('code-refused')
    expect((await attempt(next.generate(later))).kind).toBe('opened')
    expect(await actionsIn(brands[1]!.id)).toEqual([
      'person.second-factor-set',
      'person.second-factor-replaced',
    ])
  })
})

describe('a recovery code', () => {
  it('signs in once, of two requests at the same moment too, and says so by letter', async () => {
    const { recoveryCodes } = await setUp()
    const [code] = recoveryCodes
    const outcomes = await Promise.all([attempt(code), attempt(code!.toUpperCase())])
    expect(outcomes.map(({ kind }) => kind).sort()).toEqual(['code-refused', 'opened'])
    expect(await getSecondFactor(person)).toMatchObject({ codesLeft: RECOVERY_CODES - 1 })
    const letter = (await lettersTo()).at(-1)!
    expect(letter.kind).toBe('recovery-code-used')
    expect(letter.text).toContain('9 recovery codes are left')
    expect(await actionsIn(brands[0]!.id)).toContain('person.recovery-code-used')
  })

  it('is of nobody else, whatever it says', async () => {
    const { recoveryCodes } = await setUp()
    const other = await Person.create({
      email: `${randomUUID()}@people.example`,
      name: 'Another',
      passwordHash,
    })
    await other.update({ totpSecret: (await rowOf()).totpSecret, totpConfirmedAt: new Date() })
    const hashes = await RecoveryCode.findAll({ where: { personId: person.id } })
    await RecoveryCode.bulkCreate(hashes.map(({ codeHash }) => ({ personId: other.id, codeHash })))
    const outcome = await signIn({
      email: other.email,
      password,
      code: recoveryCodes[0],
      address: randomUUID(),
      userAgent: 'a test',
    })
    expect(outcome.kind).toBe('code-refused')
  })

  it('of a heap is no good once new ones are made, which takes password and code', async () => {
    const { totp, recoveryCodes } = await setUp()
    await expect(
      as(() => renewRecoveryCodes(person, { password: 'no', code: totp.generate() })),
    ).rejects.toMatchObject({ fieldErrors: { password: expect.anything() } })
    await expect(renew('000000')).rejects.toMatchObject({
      fieldErrors: { code: expect.anything() },
    })
    const fresh = (await renew(totp.generate())).recoveryCodes
    expect((await attempt(recoveryCodes[0])).kind).toBe('code-refused')
    expect((await attempt(fresh[0])).kind).toBe('opened')
    expect((await lettersTo()).map(({ kind }) => kind)).toContain('recovery-codes-renewed')
  })
})

describe('removing a second factor', () => {
  it('takes password and code, and leaves the password alone to sign in with', async () => {
    const { totp } = await setUp()
    await expect(remove('000000')).rejects.toBeInstanceOf(InvalidError)
    await remove(totp.generate())
    expect((await attempt()).kind).toBe('opened')
    expect(await rowOf()).toMatchObject({ totpSecret: null, totpPending: null })
    expect(await RecoveryCode.count({ where: { personId: person.id } })).toBe(0)
    expect((await lettersTo()).at(-1)!.kind).toBe('second-factor-removed')
    for (const { id } of brands)
      expect(await actionsIn(id)).toContain('person.second-factor-removed')
  })

  it('is done once of two requests with the same code at the same moment', async () => {
    const { totp } = await setUp()
    const code = totp.generate()
    const outcomes = await Promise.all([settled(remove(code)), settled(remove(code))])
    expect(outcomes.sort()).toEqual(['ConflictError', 'done'])
  })

  it('is refused while a brand of theirs requires one, and says which', async () => {
    const { totp } = await setUp()
    await brands[1]!.update({ secondFactorRequired: true })
    person = (await findSignedInPerson(person.sessionId))!
    const refusal = remove(totp.generate())
    await expect(refusal).rejects.toBeInstanceOf(ConflictError)
    await expect(refusal).rejects.toThrow(/^B second brand asks everybody for a second factor/)
    expect((await attempt()).kind).toBe('code-wanted')
  })

  it('counts wrong codes as the sign-in does', async () => {
    const { totp } = await setUp()
    for (let at = 0; at < RATE_LIMITS['sign-in-account'].points; at++) {
      await expect(remove('000000')).rejects.toBeInstanceOf(InvalidError)
    }
    await expect(remove(totp.generate())).rejects.toBeInstanceOf(TooManyError)
  })
})
