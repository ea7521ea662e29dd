import { randomUUID } from 'node:crypto'

import { TOTP } from 'otpauth'
import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { hashPassword } from '@/lib/auth/password'
import { RATE_LIMITS } from '@/lib/auth/constants'
import { makeRecoveryCodes, makeTotpSecret } from '@/lib/auth/second-factor'
import { signIn } from '@/lib/auth/sign-in'
import { Activity, inTransaction, Membership, Person } from '@/models'
import { makeBrand } from '@/tests/factories/brand'

const PASSWORD = 'a-long-walk-uphill'
const { points } = RATE_LIMITS['sign-in-account']
let passwordHash: string
let person: Person
let brandId: string

beforeAll(async () => {
  passwordHash = await hashPassword(PASSWORD)
})
beforeEach(async () => {
  const email = `${randomUUID()}@people.example`
  person = await Person.create({ email, name: 'Somebody', passwordHash })
  brandId = (await makeBrand()).id
  await Membership.create({ brandId, personId: person.id, role: 'owner' })
})

const attempt = ({ password = PASSWORD, code = '', address = randomUUID() as string } = {}) =>
  signIn({ email: person.email, password, code, address, userAgent: 'a test' })
const kinds = async (attempts: Parameters<typeof attempt>[0][]) => {
  const outcomes: string[] = []
  for (const one of attempts) outcomes.push((await attempt(one)).kind)
  return outcomes
}
const times = <T>(count: number, one: T): T[] => Array.from({ length: count }, () => one)

describe('wrong passwords', () => {
  it('close the account to every address, also to the right password, for a while', async () => {
    expect(await kinds(times(points, { password: 'no' }))).toEqual(times(points, 'refused'))
    const outcome = await attempt()
    expect(outcome).toMatchObject({ kind: 'too-many' })
    expect((outcome as { retryAfter: number }).retryAfter).toBeGreaterThan(60)
  })

  it('close an address to every account, one that does not exist among them', async () => {
    const address = randomUUID()
    for (let at = 0; at < points; at++) {
      await signIn({
        email: `${randomUUID()}@people.example`,
        password: 'no',
        address,
        userAgent: '',
      })
    }
    expect((await attempt({ address })).kind).toBe('too-many')
    expect((await attempt()).kind).toBe('opened')
  })

  it('are forgotten after the right one', async () => {
    await kinds(times(points - 1, { password: 'no' }))
    expect(await kinds([{}, ...times(points - 1, { password: 'no' }), {}])).toEqual([
      'opened',
      ...times(points - 1, 'refused'),
      'opened',
    ])
  })

  it('sent at the same moment are no more than in turn', async () => {
    const outcomes = await Promise.all(times(points * 3, { password: 'no' }).map(attempt))
    expect(outcomes.filter(({ kind }) => kind === 'refused')).toHaveLength(points)
  })

  it('and right ones stand in the record of the brand', async () => {
    await kinds([{ password: 'no' }, {}])
    const rows = await Activity.findAll({ where: { brandId }, order: [['createdAt', 'ASC']] })
    expect(rows.map(({ action, personId }) => [action, personId])).toEqual([
      ['session.refused', person.id],
      ['session.opened', person.id],
    ])
  })
})

describe('a password kept with weaker parameters', () => {
  it('is hashed anew when it is next used', async () => {
    const { hash } = await import('@node-rs/argon2')
    await person.update({ passwordHash: await hash(PASSWORD, { memoryCost: 8192, timeCost: 1 }) })
    expect((await attempt()).kind).toBe('opened')
    const now = await Person.unscoped().findByPk(person.id)
    expect(now!.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
    expect((await attempt()).kind).toBe('opened')
  })
})

describe('a second factor', () => {
  let totp: TOTP

  beforeEach(async () => {
    const { sealed, secret } = makeTotpSecret(person.email)
    totp = new TOTP({ secret })
    await person.update({ totpSecret: sealed, totpConfirmedAt: new Date() })
  })

  it('is asked for once the password fits, and lets in with a code', async () => {
    expect(await kinds([{ password: 'no' }, {}, { code: totp.generate() }])).toEqual([
      'refused',
      'code-wanted',
      'opened',
    ])
  })

  it('takes each code once, also of two requests at the same moment', async () => {
    const code = totp.generate()
    const outcomes = await Promise.all([attempt({ code }), attempt({ code })])
    expect(outcomes.map(({ kind }) => kind).sort()).toEqual(['code-refused', 'opened'])
  })

  it('counts wrong codes, however often a code is asked for in between', async () => {
    const wrong = times(points, [{ code: '000 000' }, {}]).flat()
    const outcomes = await kinds([...wrong, { code: totp.generate() }])
    expect(outcomes.filter((kind) => kind === 'code-refused').length).toBeLessThanOrEqual(points)
    expect(outcomes.at(-1)).toBe('too-many')
  })

  it('can be stood in for by a recovery code, once', async () => {
    const [code] = await inTransaction((transaction) => makeRecoveryCodes(person.id, transaction))
    expect(await kinds([{ code }, { code }])).toEqual(['opened', 'code-refused'])
  })

  it('is kept sealed', async () => {
    const row = await Person.unscoped().findByPk(person.id)
    expect(row!.totpSecret).not.toContain(totp.secret.base32)
  })
})
