import { randomUUID } from 'node:crypto'

import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { forgive } from '@/lib/auth/rate-limits'
import { ForbiddenError, NotFoundError } from '@/lib/errors'
import { ROLES, type Role } from '@/lib/people/constants'
import { changeRole } from '@/lib/team/change-role'
import { inviteMembers } from '@/lib/team/invite-members'
import { leaveBrand } from '@/lib/team/leave-brand'
import { presentMember } from '@/lib/team/present'
import { listInvitations, listMembers } from '@/lib/team/queries'
import { removeMember } from '@/lib/team/remove-member'
import { resendInvitation } from '@/lib/team/resend-invitation'
import { withdrawInvitation } from '@/lib/team/withdraw-invitation'
import { Invitation, Membership, type Brand } from '@/models'
import { makeActor, makeActors, makeBrand } from '@/tests/factories/brand'
import { age, anAddress, makeInvitation } from '@/tests/factories/invitation'

let brand: Brand
let ours: Record<Role, Actor>
let theirs: Actor

beforeAll(async () => {
  brand = await makeBrand('Ours')
  ours = await makeActors(brand)
  // A second owner, so that nobody is the last.
  await makeActor(brand)
  theirs = await makeActor(await makeBrand('Theirs'))
})

// None of this is about how often.
beforeEach(() => forgive('invitation', ours.owner.brandId))

interface Rows {
  membershipId: string
  invitationId: string
}

const membershipOf = async ({ brandId, personId }: Actor): Promise<Membership> =>
  Membership.findOne({ where: { brandId, personId }, rejectOnEmpty: true })

/** A member and an invitation of our brand that nothing has happened to. */
async function makeRows(): Promise<Rows> {
  const { owner } = ours
  const member = await makeActor(brand, 'dyer')
  const { invitation } = await makeInvitation(owner)
  await age(invitation, 120_000)
  return { membershipId: (await membershipOf(member)).id, invitationId: invitation.id }
}

type Doing = (actor: Actor, rows: Rows) => Promise<unknown>
const DOINGS: { name: string; do: Doing; roles: readonly Role[]; ofARow: boolean }[] = [
  { name: 'see the team', do: (a) => listMembers(a), roles: ROLES, ofARow: false },
  { name: 'see the invitations', do: (a) => listInvitations(a), roles: ['owner'], ofARow: false },
  {
    name: 'invite',
    do: (a) => inviteMembers(a, { emails: [anAddress()], role: 'dyer', requestKey: randomUUID() }),
    roles: ['owner'],
    ofARow: false,
  },
  {
    name: 'send an invitation again',
    do: (a, { invitationId }) => resendInvitation(a, { invitationId }),
    roles: ['owner'],
    ofARow: true,
  },
  {
    name: 'withdraw an invitation',
    do: (a, { invitationId }) => withdrawInvitation(a, { invitationId }),
    roles: ['owner'],
    ofARow: true,
  },
  {
    name: 'change a role',
    do: (a, { membershipId }) => changeRole(a, { membershipId, role: 'marketer', was: 'dyer' }),
    roles: ['owner'],
    ofARow: true,
  },
  {
    name: 'remove a member',
    do: (a, { membershipId }) => removeMember(a, { membershipId }),
    roles: ['owner'],
    ofARow: true,
  },
]

describe('who may do what with a team', () => {
  for (const doing of DOINGS) {
    for (const role of ROLES) {
      const may = doing.roles.includes(role)
      it(`${role} ${may ? 'may' : 'may not'} ${doing.name}`, async () => {
        const rows = await makeRows()
        const done = doing.do(ours[role], rows)
        if (may) await expect(done).resolves.not.toThrow()
        else await expect(done).rejects.toBeInstanceOf(ForbiddenError)
      })
    }
    if (!doing.ofARow) continue
    it(`the owner of another brand is told there is nothing when they want to ${doing.name}, and nothing changes`, async () => {
      const rows = await makeRows()
      const state = async () =>
        JSON.stringify([
          await Membership.findByPk(rows.membershipId),
          await Invitation.findByPk(rows.invitationId),
        ])
      const before = await state()
      const unknown = { membershipId: randomUUID(), invitationId: randomUUID() }
      const [refused, none] = await Promise.all(
        [rows, unknown].map((one) => doing.do(theirs, one).catch((error: unknown) => error)),
      )
      expect(refused).toBeInstanceOf(NotFoundError)
      expect((refused as Error).message).toBe((none as Error).message)
      expect(await state()).toBe(before)
    })
  }

  for (const role of ROLES) {
    it(`${role} may leave`, async () => {
      const actor = await makeActor(brand, role)
      await leaveBrand(actor)
      await expect(membershipOf(actor)).rejects.toThrow()
    })
  }
})

describe('what of a member is shown', () => {
  it('is an e-mail address and a second factor to owners, and to nobody else', async () => {
    for (const role of ROLES) {
      const seen = (await listMembers(ours[role])).map((one) => presentMember(ours[role], one))
      expect(seen.filter(({ isYou }) => isYou)).toHaveLength(1)
      const text = JSON.stringify(seen)
      expect(text.includes('@people.example'), role).toBe(role === 'owner')
      expect(text.includes('hasSecondFactor'), role).toBe(role === 'owner')
      expect(text).not.toMatch(/password|totp|"-"/)
    }
  })

  it('is of their own brand only', async () => {
    const [a, b] = await Promise.all([listMembers(ours.owner), listMembers(theirs)])
    const brands = (rows: Membership[]) => new Set(rows.map(({ brandId }) => brandId))
    expect(brands(a)).toEqual(new Set([ours.owner.brandId]))
    expect(brands(b)).toEqual(new Set([theirs.brandId]))
    await makeInvitation(ours.owner)
    expect(await listInvitations(theirs)).toEqual([])
  })
})
