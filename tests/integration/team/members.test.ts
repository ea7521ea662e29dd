import { beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { actorIn, findSignedInPerson } from '@/lib/auth/sessions'
import { openSession } from '@/lib/auth/sign-in'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import type { Role } from '@/lib/people/constants'
import { changeRole } from '@/lib/team/change-role'
import { leaveBrand } from '@/lib/team/leave-brand'
import { removeMember } from '@/lib/team/remove-member'
import { Activity, Membership, Person, type Brand } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import { lettersTo } from '@/tests/factories/invitation'

let brand: Brand
let owner: Actor

beforeEach(async () => {
  brand = await makeBrand('Sedge & Son')
  owner = await makeActor(brand)
})

const membershipOf = ({ brandId, personId }: Actor) =>
  Membership.findOne({ where: { brandId, personId } })
const idOf = async (actor: Actor) => (await membershipOf(actor))!.id
const roleOf = async (actor: Actor) => (await membershipOf(actor))?.role ?? null
const give = async (by: Actor, to: Actor, role: Role) =>
  changeRole(by, { membershipId: await idOf(to), role, was: (await roleOf(to))! })
const remove = async (by: Actor, whom: Actor) =>
  removeMember(by, { membershipId: await idOf(whom) })
const lettersOf = async ({ personId }: Actor) =>
  lettersTo((await Person.findByPk(personId, { rejectOnEmpty: true })).email)
const ownersOf = ({ id: brandId }: Brand) => Membership.count({ where: { brandId, role: 'owner' } })
const session = ({ personId }: Actor) => openSession(personId, { address: '', userAgent: '' })
const actorNow = async (sessionId: string) =>
  actorIn((await findSignedInPerson(sessionId))!, brand.slug)

describe('changing a role', () => {
  it('holds from the member’s next request on, is told by a letter, and stands in the record', async () => {
    const member = await makeActor(brand, 'designer')
    const sessionId = await session(member)
    expect((await actorNow(sessionId))!.role).toBe('designer')
    await give(owner, member, 'dyer')
    expect((await actorNow(sessionId))!.role).toBe('dyer')
    const [letter] = await lettersOf(member)
    expect(letter!.subject).toBe('Your role at Sedge & Son has changed')
    for (const text of [letter!.text, letter!.html.replace(/&#38;/g, '&')]) {
      expect(text).toContain('you were a designer and are now its dye house')
      expect(text).toContain(`${process.env.APP_ORIGIN}/${brand.slug}`)
    }
    const row = await Activity.findOne({
      where: { brandId: brand.id, action: 'membership.role-changed' },
    })
    expect(row).toMatchObject({
      personId: owner.personId,
      objectId: member.personId,
      before: { role: 'designer' },
      after: { role: 'dyer' },
    })
  })

  it('to the one they have does nothing and tells nobody', async () => {
    const member = await makeActor(brand, 'designer')
    await give(owner, member, 'designer')
    expect(await lettersOf(member)).toEqual([])
  })

  it('that somebody else has changed meanwhile is refused', async () => {
    const member = await makeActor(brand, 'designer')
    const membershipId = await idOf(member)
    await give(owner, member, 'marketer')
    const late = changeRole(owner, { membershipId, role: 'dyer', was: 'designer' })
    await expect(late).rejects.toBeInstanceOf(ConflictError)
    expect(await roleOf(member)).toBe('marketer')
  })
})

describe('removing a member', () => {
  it('refuses their next request there, leaves their other brands, and tells them', async () => {
    const member = await makeActor(brand, 'designer')
    const other = await makeBrand('Another brand')
    await Membership.create({ brandId: other.id, personId: member.personId, role: 'owner' })
    const sessionId = await session(member)
    expect(await actorNow(sessionId)).not.toBeNull()
    await remove(owner, member)
    expect(await actorNow(sessionId)).toBeNull()
    const person = (await findSignedInPerson(sessionId))!
    expect(person.memberships.map(({ brandSlug }) => brandSlug)).toEqual([other.slug])
    const [letter] = await lettersOf(member)
    expect(letter!.subject).toBe('You are no longer part of Sedge & Son')
    expect(letter!.text).toContain('A owner has removed you from the team of Sedge & Son')
    expect(letter!.html).toContain('your account and your other brands stay as they are')
  })

  it('who is oneself is refused: leaving is another thing', async () => {
    await makeActor(brand)
    await expect(remove(owner, owner)).rejects.toBeInstanceOf(ConflictError)
    expect(await roleOf(owner)).toBe('owner')
  })

  it('twice says the second time that there is nobody', async () => {
    const member = await makeActor(brand, 'dyer')
    const membershipId = await idOf(member)
    const twice = await Promise.allSettled([1, 2].map(() => removeMember(owner, { membershipId })))
    const refused = twice.filter((one) => one.status === 'rejected')
    expect(refused.map(({ reason }) => reason as unknown)).toEqual([expect.any(NotFoundError)])
    expect(await lettersOf(member)).toHaveLength(1)
  })
})

describe('the last owner', () => {
  it('can neither give the role up nor leave, until there is another', async () => {
    const member = await makeActor(brand, 'designer')
    await expect(give(owner, owner, 'dyer')).rejects.toBeInstanceOf(ConflictError)
    await expect(leaveBrand(owner)).rejects.toBeInstanceOf(ConflictError)
    expect(await ownersOf(brand)).toBe(1)
    await give(owner, member, 'owner')
    await leaveBrand(owner)
    expect(await roleOf(owner)).toBeNull()
    expect(await ownersOf(brand)).toBe(1)
  })

  it('is not found in another brand', async () => {
    const other = await makeBrand('Another brand')
    await Membership.create({ brandId: other.id, personId: owner.personId, role: 'owner' })
    await makeActor(other)
    await expect(leaveBrand(owner)).rejects.toBeInstanceOf(ConflictError)
  })

  const RACES: { name: string; race: (a: Actor, b: Actor) => Promise<unknown>[] }[] = [
    {
      name: 'two owners who demote each other',
      race: (a, b) => [give(a, b, 'dyer'), give(b, a, 'dyer')],
    },
    { name: 'two owners who remove each other', race: (a, b) => [remove(a, b), remove(b, a)] },
    { name: 'two owners who both leave', race: (a, b) => [leaveBrand(a), leaveBrand(b)] },
    {
      name: 'an owner who leaves while demoting the other',
      race: (a, b) => [leaveBrand(a), give(a, b, 'dyer')],
    },
  ]
  for (const { name, race } of RACES) {
    it(`remains of ${name} at the same moment`, async () => {
      for (let round = 0; round < 6; round++) {
        const contested = await makeBrand()
        const [a, b] = [await makeActor(contested), await makeActor(contested)]
        const outcomes = await Promise.allSettled(race(a, b))
        expect(outcomes.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
        expect(await ownersOf(contested)).toBe(1)
      }
    })
  }

  it('is decided by whoever is an owner still: one who was demoted changes nobody any more', async () => {
    const [second, third] = [await makeActor(brand), await makeActor(brand)]
    await give(owner, second, 'dyer')
    // `second` is an owner by a lookup from before.
    await expect(give(second, third, 'dyer')).rejects.toBeInstanceOf(ForbiddenError)
    await expect(remove(second, third)).rejects.toBeInstanceOf(ForbiddenError)
    expect(await roleOf(third)).toBe('owner')
  })
})

describe('leaving', () => {
  it('ends what the person could do there, and keeps a line in the record without a name', async () => {
    const member = await makeActor(brand, 'marketer')
    const sessionId = await session(member)
    await leaveBrand(member)
    expect(await actorNow(sessionId)).toBeNull()
    const row = await Activity.findOne({ where: { brandId: brand.id, action: 'membership.left' } })
    expect(row).toMatchObject({ personId: member.personId, before: { role: 'marketer' } })
    expect(JSON.stringify(row)).not.toContain(member.personName)
  })
})
