import { randomUUID } from 'node:crypto'

import { beforeEach, describe, expect, it } from 'vitest'

import { RATE_LIMITS } from '@/lib/auth/constants'
import { digest } from '@/lib/auth/seal'
import { signIn } from '@/lib/auth/sign-in'
import { TooManyError } from '@/lib/errors'
import { confirmSignUp } from '@/lib/people/confirm-sign-up'
import { signUp } from '@/lib/people/sign-up'
import { sweepPeople } from '@/lib/people/sweep'
import { Activity, Brand, Membership, Person, SignUp } from '@/models'
import { makePerson } from '@/tests/factories/person'
import { lettersTo, tokenSentTo } from '@/tests/integration/setup/letters'

const PASSWORD = 'three hills and a ford'
let email: string

beforeEach(() => {
  email = `${randomUUID()}@people.example`
})

const ask = (terms: Partial<Parameters<typeof signUp>[0]> = {}, address: string = randomUUID()) =>
  signUp(
    { name: 'Isla Farrow', email, password: PASSWORD, brandName: 'Ashgill', ...terms },
    { address },
  )
const token = () => tokenSentTo(email, 'sign-up')
const confirm = async (password = PASSWORD) => confirmSignUp({ token: await token(), password })
const enter = () => signIn({ email, password: PASSWORD, address: randomUUID(), userAgent: '' })

describe('signing up', () => {
  it('makes nobody and nothing before the link of the letter is confirmed', async () => {
    await ask()
    expect(await Person.count({ where: { email } })).toBe(0)
    expect((await enter()).kind).toBe('refused')
    const row = await SignUp.findOne({ where: { email }, rejectOnEmpty: true })
    expect(row.tokenHash).toBe(digest(await token()))
    expect(row.passwordHash).toMatch(/^\$argon2id/)
  })

  it('once confirmed makes a person and a brand of which they are the owner', async () => {
    const brandName = `Wether ${randomUUID().slice(0, 8)}`
    await ask({ brandName })
    const { brandSlug } = await confirm()
    expect(brandSlug).toBe(brandName.toLowerCase().replace(' ', '-'))
    const person = await Person.findOne({ where: { email }, rejectOnEmpty: true })
    expect(person.name).toBe('Isla Farrow')
    const brand = await Brand.findOne({ where: { slug: brandSlug }, rejectOnEmpty: true })
    const members = await Membership.findAll({ where: { brandId: brand.id } })
    expect(members).toMatchObject([{ personId: person.id, role: 'owner' }])
    const rows = await Activity.findAll({ where: { brandId: brand.id } })
    expect(rows).toMatchObject([{ action: 'brand.created', personId: person.id }])
    expect((await enter()).kind).toBe('opened')
  })

  it('is confirmed by its link and password together, so that nobody opens an account for another', async () => {
    await ask()
    await expect(confirm('another password of mine')).rejects.toMatchObject({
      fieldErrors: { password: [expect.stringMatching(/not the password you chose/)] },
    })
    expect(await Person.count({ where: { email } })).toBe(0)
    await confirm()
  })

  it('is confirmed once, also at the same moment', async () => {
    await ask()
    const outcomes = await Promise.allSettled([confirm(), confirm(), confirm()])
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    await expect(confirm()).rejects.toThrow(/no longer good/)
    expect(await Person.count({ where: { email } })).toBe(1)
  })

  it('is not confirmed by a link that is too old or made up', async () => {
    await ask()
    await SignUp.update({ expiresAt: new Date() }, { where: { email } })
    await expect(confirm()).rejects.toThrow(/no longer good/)
    const madeUp = { token: 'x'.repeat(43), password: PASSWORD }
    await expect(confirmSignUp(madeUp)).rejects.toThrow(/no longer good/)
  })

  it('with an address that has an account answers alike, changes nothing, and says so by letter', async () => {
    const person = await makePerson()
    expect(await ask({ email: person.email, name: 'Somebody Else' })).toEqual(await ask())
    expect(await SignUp.count({ where: { email: person.email } })).toBe(0)
    const letters = await lettersTo(person.email)
    expect(letters.map(({ kind }) => kind)).toEqual(['account-exists'])
    expect(letters[0]!.text).not.toContain('Somebody Else')
    expect((await Person.findByPk(person.id))!.name).toBe(person.name)
  })

  it('whose address was given an account meanwhile says so and makes nothing', async () => {
    await ask()
    await Person.create({ email, name: 'Invited', passwordHash: '-' })
    const brands = await Brand.count()
    await expect(confirm()).rejects.toMatchObject({ code: 'conflict' })
    expect(await Brand.count()).toBe(brands)
  })

  it('gives brands of one name addresses of their own, and none of ours', async () => {
    const brandName = `Gill ${randomUUID().slice(0, 8)}`
    const slugs = []
    for (const name of [brandName, brandName, 'Account', '毛糸']) {
      email = `${randomUUID()}@people.example`
      await ask({ brandName: name })
      slugs.push((await confirm()).brandSlug)
    }
    const base = brandName.toLowerCase().replace(' ', '-')
    expect(slugs.slice(0, 2)).toEqual([base, `${base}-2`])
    expect(slugs[2]).toMatch(/^account-\d+$/)
    expect(slugs[3]).toMatch(/^brand(-\d+)?$/)
  })

  it('refuses a password made of the person’s or the brand’s name', async () => {
    await expect(ask({ password: 'Isla Farrow Ashgill' })).rejects.toMatchObject({
      fieldErrors: { password: [expect.stringMatching(/first passwords/)] },
    })
  })

  it('can be asked for so often from one place, and so often for one address', async () => {
    const place = randomUUID()
    for (let at = 0; at < RATE_LIMITS['sign-up-address'].points; at++) {
      await ask({ email: `${randomUUID()}@people.example` }, place)
    }
    await expect(ask({}, place)).rejects.toBeInstanceOf(TooManyError)
    for (let at = 0; at < RATE_LIMITS['sign-up-email'].points; at++) await ask()
    await expect(ask()).rejects.toBeInstanceOf(TooManyError)
  })

  it('that is never confirmed is forgotten', async () => {
    await ask()
    await SignUp.update({ expiresAt: new Date(Date.now() - 1) }, { where: { email } })
    expect((await sweepPeople()).signUps).toBeGreaterThan(0)
    expect(await SignUp.count({ where: { email } })).toBe(0)
  })
})
