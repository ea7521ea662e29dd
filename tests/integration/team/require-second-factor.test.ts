import { beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { openSession } from '@/lib/auth/sign-in'
import { actorIn, findSignedInPerson, type SignedInPerson } from '@/lib/auth/sessions'
import { ConflictError, ForbiddenError, SecondFactorNeededError } from '@/lib/errors'
import { getSecondFactorRequirement } from '@/lib/team/get-second-factor-requirement'
import { requireSecondFactor } from '@/lib/team/require-second-factor'
import { Activity, Membership, Person, type Brand } from '@/models'
import { makeActors, makeBrand } from '@/tests/factories/brand'
import type { Role } from '@/lib/people/constants'

let ours: Brand
let theirs: Brand
let actors: Record<Role, Actor>

beforeEach(async () => {
  ours = await makeBrand('Ours')
  theirs = await makeBrand('Theirs')
  actors = await makeActors(ours)
})

/** Gives somebody a second factor, without the way there. */
const giveFactor = ({ personId }: Actor) =>
  Person.update({ totpSecret: '-', totpConfirmedAt: new Date() }, { where: { id: personId } })

async function signedIn({ personId }: Actor): Promise<SignedInPerson> {
  return (await findSignedInPerson(await openSession(personId, { address: '', userAgent: '' })))!
}

describe('requiring a second factor', () => {
  it('is for an owner who has one, and for nobody else', async () => {
    for (const role of ['marketer', 'designer', 'dyer'] as const) {
      await giveFactor(actors[role])
      await expect(requireSecondFactor(actors[role], { required: true })).rejects.toBeInstanceOf(
        ForbiddenError,
      )
    }
    await expect(requireSecondFactor(actors.owner, { required: true })).rejects.toBeInstanceOf(
      ConflictError,
    )
    await giveFactor(actors.owner)
    expect(await requireSecondFactor(actors.owner, { required: true })).toEqual({ required: true })
    await Promise.all([ours.reload(), theirs.reload()])
    expect([ours.secondFactorRequired, theirs.secondFactorRequired]).toEqual([true, false])
  })

  it('stands in the record with before and after, once however often it is asked for', async () => {
    await giveFactor(actors.owner)
    await Promise.all([1, 2, 3].map(() => requireSecondFactor(actors.owner, { required: true })))
    await requireSecondFactor(actors.owner, { required: false })
    const rows = await Activity.findAll({
      where: { brandId: ours.id },
      order: [['createdAt', 'ASC']],
    })
    expect(rows.map(({ action, before, after }) => ({ action, before, after }))).toEqual(
      [true, false].map((required) => ({
        action: 'brand.second-factor-requirement-changed',
        before: { required: !required },
        after: { required },
      })),
    )
  })

  it('names to the owner, and to nobody else, who has none', async () => {
    await giveFactor(actors.owner)
    await giveFactor(actors.dyer)
    expect(await getSecondFactorRequirement(actors.owner)).toEqual({
      required: false,
      ownInUse: true,
      without: ['A designer', 'A marketer'],
    })
    await expect(getSecondFactorRequirement(actors.designer)).rejects.toBeInstanceOf(ForbiddenError)
  })
})

describe('a brand that requires a second factor', () => {
  beforeEach(async () => {
    await giveFactor(actors.owner)
    await requireSecondFactor(actors.owner, { required: true })
  })

  it('makes nobody an actor who has none, and says why; another brand of theirs is open', async () => {
    const { personId } = actors.designer
    await Membership.create({ brandId: theirs.id, personId, role: 'designer' })
    const person = await signedIn(actors.designer)
    expect(() => actorIn(person, ours.slug)).toThrow(SecondFactorNeededError)
    expect(() => actorIn(person, ours.slug)).toThrow(/^Ours asks everybody for a second factor/)
    expect(actorIn(person, theirs.slug)).toMatchObject({ brandId: theirs.id })
  })

  it('answers who is not one of it as a brand that does not exist', async () => {
    const [stranger] = Object.values(await makeActors(theirs))
    expect(actorIn(await signedIn(stranger!), ours.slug)).toBeNull()
  })

  it('is open again, in the same session, once they have one', async () => {
    const { sessionId } = await signedIn(actors.designer)
    await giveFactor(actors.designer)
    const actor = actorIn((await findSignedInPerson(sessionId))!, ours.slug)
    expect(actor).toEqual({ ...actors.designer })
  })
})
