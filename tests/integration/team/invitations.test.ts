import { randomUUID } from 'node:crypto'

import { beforeAll, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/auth/actor'
import { RATE_LIMITS } from '@/lib/auth/constants'
import { digest } from '@/lib/auth/seal'
import type { SignedInPerson } from '@/lib/auth/sessions'
import { findSignedInPerson } from '@/lib/auth/sessions'
import { openSession, signIn } from '@/lib/auth/sign-in'
import { ConflictError, InvalidError, NotFoundError, TooManyError } from '@/lib/errors'
import { acceptInvitation } from '@/lib/team/accept-invitation'
import { INVITATION_DAYS, TEAM_LIMITS } from '@/lib/team/constants'
import { inviteMembers } from '@/lib/team/invite-members'
import { joinAsNewPerson } from '@/lib/team/join-as-new-person'
import { getOffer, listInvitations } from '@/lib/team/queries'
import { removeMember } from '@/lib/team/remove-member'
import { resendInvitation } from '@/lib/team/resend-invitation'
import { inviteMembersSchema } from '@/lib/team/schema'
import { withdrawInvitation } from '@/lib/team/withdraw-invitation'
import { Activity, Invitation, Membership, Person, sequelize } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'
import {
  age,
  anAddress,
  lettersTo,
  makeInvitation,
  tokenSentTo,
} from '@/tests/factories/invitation'

const WEEK = INVITATION_DAYS * 24 * 3_600_000
const PASSWORD = 'a lantern under the larches'
const from = { address: '192.0.2.7', userAgent: 'a test' }

let owner: Actor
let elsewhere: Actor

beforeAll(async () => {
  elsewhere = await makeActor(await makeBrand('Elsewhere'))
})
beforeEach(async () => {
  owner = { ...(await makeActor(await makeBrand('Sedge & Son'))), personName: 'Ottilie <Sedge>' }
})

const invite = (emails: string, requestKey: string = randomUUID()) =>
  inviteMembers(owner, inviteMembersSchema.parse({ emails, role: 'designer', requestKey }))

async function makeSignedIn(email = anAddress()): Promise<SignedInPerson> {
  const person = await Person.create({ email, name: 'Somebody', passwordHash: '-' })
  return (await findSignedInPerson(await openSession(person.id, from)))!
}

const rolesOf = async (personId: string) =>
  (await Membership.findAll({ where: { personId } })).map(({ brandId, role }) => [brandId, role])

const actionsOf = async (brandId: string) =>
  (await Activity.findAll({ where: { brandId }, order: [['createdAt', 'ASC']] })).map(
    ({ action }) => action,
  )

const asNewPerson = (token: string, password = PASSWORD) =>
  joinAsNewPerson({ token, name: 'Wilf Tansy', password })

describe('inviting', () => {
  it('writes one letter to each address of a pasted list, and says who needs none', async () => {
    const member = await Person.findByPk(owner.personId, { rejectOnEmpty: true })
    const [first, second, waiting] = [anAddress(), anAddress(), anAddress()]
    await invite(waiting)
    const answer = await invite(
      `${first.toUpperCase()}, Second One <${second}>;\n${waiting}\n${member.email} ${first}`,
    )
    expect(answer).toEqual({
      invited: [first, second].sort(),
      members: [member.email],
      waiting: [waiting],
    })
    for (const email of [first, second, waiting]) expect(await lettersTo(email)).toHaveLength(1)
    expect(await lettersTo(member.email)).toEqual([])
    const listed = (await listInvitations(owner)).map(({ email }) => email)
    expect(listed.sort()).toEqual([first, second, waiting].sort())
  })

  it('refuses the whole list and names what is no address in it', async () => {
    const email = anAddress()
    const parsed = inviteMembersSchema.safeParse({
      emails: `${email}, wilf-at-home`,
      role: 'designer',
      requestKey: randomUUID(),
    })
    expect(parsed.error!.issues[0]!.message).toContain('“wilf-at-home” is no e-mail address')
    expect(await lettersTo(email)).toEqual([])
  })

  it('by the same form ten times at once writes one letter, and each gets the same answer', async () => {
    const email = anAddress()
    const requestKey = randomUUID()
    const answers = await Promise.all(Array.from({ length: 10 }, () => invite(email, requestKey)))
    for (const answer of answers) {
      expect(answer).toEqual({ invited: [email], members: [], waiting: [] })
    }
    expect(await lettersTo(email)).toHaveLength(1)
    expect(await actionsOf(owner.brandId)).toEqual(['membership.invited'])
  })

  it('of one address by two owners at once makes one invitation', async () => {
    const email = anAddress()
    const answers = await Promise.all([invite(email), invite(email)])
    expect(answers.map(({ invited }) => invited.length).sort()).toEqual([0, 1])
    expect(answers.map(({ waiting }) => waiting.length).sort()).toEqual([0, 1])
    expect(await lettersTo(email)).toHaveLength(1)
  })

  it('the same address into two brands makes two invitations that know nothing of each other', async () => {
    const email = anAddress()
    await invite(email)
    const { token } = await makeInvitation(elsewhere, { email, role: 'dyer' })
    const person = await makeSignedIn(email)
    expect(await acceptInvitation(person, { token })).toEqual({ brandSlug: elsewhere.brandSlug })
    expect(await rolesOf(person.id)).toEqual([[elsewhere.brandId, 'dyer']])
  })

  it('is limited by the hour and the brand; what sends no letter does not count', async () => {
    const { points } = RATE_LIMITS.invitation
    const waiting = anAddress()
    await invite(waiting)
    for (let at = 0; at < 5; at++) await invite(waiting)
    const many = (count: number) => Array.from({ length: count }, anAddress).join('\n')
    await invite(many(TEAM_LIMITS.addresses))
    const left = points - 1 - TEAM_LIMITS.addresses
    const refused = await invite(many(left + 1)).catch((error: unknown) => error)
    expect(refused).toBeInstanceOf(TooManyError)
    await invite(many(left))
    await expect(invite(anAddress())).rejects.toBeInstanceOf(TooManyError)
    // Another brand has its own count.
    await makeInvitation(elsewhere)
  })

  it('an address whose invitation has expired makes a new one in its place', async () => {
    const { email, token, invitation } = await makeInvitation(owner)
    await age(invitation, WEEK + 1)
    expect((await invite(email)).invited).toEqual([email])
    await expect(getOffer(null, token)).rejects.toBeInstanceOf(NotFoundError)
    expect((await getOffer(null, await tokenSentTo(email))).kind).toBe('open')
    expect(await listInvitations(owner)).toHaveLength(1)
  })

  it('more people than a team holds is refused, and nobody is invited', async () => {
    const { brandId, personId } = owner
    await Invitation.bulkCreate(
      Array.from({ length: TEAM_LIMITS.perBrand - 1 }, () => ({
        brandId,
        email: anAddress(),
        role: 'dyer' as const,
        tokenHash: digest(randomUUID()),
        invitedById: personId,
        expiresAt: new Date(Date.now() + WEEK),
      })),
    )
    const email = anAddress()
    await expect(invite(email)).rejects.toBeInstanceOf(ConflictError)
    expect(await lettersTo(email)).toEqual([])
  })
})

describe('the letter', () => {
  it('says who invites, to what, as what and until when, in text and in HTML, with a link of ours', async () => {
    const { email, token, invitation } = await makeInvitation(owner)
    const [letter] = await lettersTo(email)
    const link = `${process.env.APP_ORIGIN}/invitations/${token}`
    const until = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })
    expect(letter!.subject).toBe('Ottilie <Sedge> invites you to Sedge & Son')
    for (const part of [
      'Ottilie <Sedge> invites you to join Sedge & Son on Woadmap as a designer.',
      until.format(invitation.expiresAt),
      'If you do not know Ottilie <Sedge> or Sedge & Son, do nothing',
      `Open the invitation:\n${link}\n`,
    ]) {
      expect(letter!.text).toContain(part)
    }
    expect(letter!.html).toContain('Sedge &#38; Son')
    expect(letter!.html).toContain('Ottilie &#60;Sedge&#62;')
    expect(letter!.html).not.toContain('<Sedge>')
    expect(letter!.html).toContain(`href="${link}"`)
  })

  it('alone holds the token: the database knows its hash, and the letter lies sealed', async () => {
    const { token } = await makeInvitation(owner)
    for (const table of ['invitations', 'letters', 'activities', 'pgboss.job']) {
      const [rows] = await sequelize().query(`SELECT * FROM ${table}`)
      expect(rows.length, table).toBeGreaterThan(0)
      expect(JSON.stringify(rows).includes(token), table).toBe(false)
    }
  })
})

describe('accepting with an account', () => {
  it('joins with it and the role of the invitation, once', async () => {
    const person = await makeSignedIn()
    const { token, invitation } = await makeInvitation(owner, { email: person.email })
    expect(await getOffer(person, token)).toMatchObject({ kind: 'open', next: 'join' })
    expect(await acceptInvitation(person, { token })).toEqual({ brandSlug: owner.brandSlug })
    expect(await rolesOf(person.id)).toEqual([[owner.brandId, 'designer']])
    const now = (await findSignedInPerson(person.sessionId))!
    expect(now.memberships.map(({ brandSlug }) => brandSlug)).toEqual([owner.brandSlug])
    await invitation.reload()
    expect(invitation.acceptedAt).not.toBeNull()
    expect(await actionsOf(owner.brandId)).toEqual(['membership.invited', 'membership.joined'])
  })

  it('again, also at the same moment, gives the same answer and changes nothing', async () => {
    const person = await makeSignedIn()
    const { token } = await makeInvitation(owner, { email: person.email })
    const twice = await Promise.all([1, 2, 3].map(() => acceptInvitation(person, { token })))
    expect(new Set(twice.map(({ brandSlug }) => brandSlug))).toEqual(new Set([owner.brandSlug]))
    expect(await rolesOf(person.id)).toHaveLength(1)
    const now = (await findSignedInPerson(person.sessionId))!
    expect(await getOffer(now, token)).toEqual({ kind: 'joined', brandSlug: owner.brandSlug })
    expect(await actionsOf(owner.brandId)).toEqual(['membership.invited', 'membership.joined'])
  })

  it('does not let a removed member back in by the link they came by', async () => {
    const person = await makeSignedIn()
    const { token } = await makeInvitation(owner, { email: person.email })
    await acceptInvitation(person, { token })
    const where = { brandId: owner.brandId, personId: person.id }
    const member = await Membership.findOne({ where, rejectOnEmpty: true })
    await removeMember(owner, { membershipId: member.id })
    await expect(acceptInvitation(person, { token })).rejects.toBeInstanceOf(NotFoundError)
    expect(await rolesOf(person.id)).toEqual([])
  })

  it('of another address is refused in words, and the invitation stays good', async () => {
    const stranger = await makeSignedIn()
    const { token, email } = await makeInvitation(owner)
    expect(await getOffer(stranger, token)).toMatchObject({ next: 'other-account' })
    const refused = await acceptInvitation(stranger, { token }).catch((error: unknown) => error)
    expect(refused).toBeInstanceOf(ConflictError)
    expect((refused as Error).message).toContain(`you are signed in as ${stranger.email}`)
    expect(await rolesOf(stranger.id)).toEqual([])
    expect(await getOffer(null, token)).toMatchObject({ next: 'new-account' })
    await makeSignedIn(email)
    expect(await getOffer(null, token)).toMatchObject({ next: 'sign-in' })
  })

  it('keeps the role of somebody who is a member already, and uses the invitation up', async () => {
    const person = await makeSignedIn()
    const { token } = await makeInvitation(owner, { email: person.email, role: 'owner' })
    await Membership.create({ brandId: owner.brandId, personId: person.id, role: 'dyer' })
    await acceptInvitation(person, { token })
    expect(await rolesOf(person.id)).toEqual([[owner.brandId, 'dyer']])
    expect(await listInvitations(owner)).toEqual([])
  })
})

describe('accepting without an account', () => {
  it('makes one that signs in by its password, and opens no session itself', async () => {
    const { token, email } = await makeInvitation(owner)
    expect(await getOffer(null, token)).toMatchObject({ next: 'new-account' })
    expect(await asNewPerson(token)).toEqual({ email, brandSlug: owner.brandSlug })
    const person = await Person.findOne({ where: { email }, rejectOnEmpty: true })
    expect(person.name).toBe('Wilf Tansy')
    expect(
      await sequelize().query('SELECT 1 FROM sessions WHERE person_id = $1', {
        bind: [person.id],
      }),
    ).toMatchObject([[], {}])
    const attempt = await signIn({ email, password: PASSWORD, ...from })
    if (attempt.kind !== 'opened') throw new Error(attempt.kind)
    const signedIn = (await findSignedInPerson(attempt.sessionId))!
    expect(signedIn.memberships).toMatchObject([{ brandSlug: owner.brandSlug, role: 'designer' }])
  })

  it('with a password that will not do is refused under its field, and the link stays good', async () => {
    const { token, email } = await makeInvitation(owner)
    const refused = await asNewPerson(token, 'short').catch((error: unknown) => error)
    expect(refused).toBeInstanceOf(InvalidError)
    expect((refused as InvalidError).fieldErrors).toHaveProperty('password')
    expect(await Person.count({ where: { email } })).toBe(0)
    await asNewPerson(token)
  })

  it('twice at once makes one person; the second is told that the invitation was used', async () => {
    const { token, email } = await makeInvitation(owner)
    const answers = await Promise.allSettled([asNewPerson(token), asNewPerson(token)])
    expect(answers.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(await Person.count({ where: { email } })).toBe(1)
    const later = await asNewPerson(token).catch((error: unknown) => error)
    expect(later).toBeInstanceOf(ConflictError)
    expect((later as Error).message).toContain('sign in')
  })

  it('cannot set the password of an account that exists', async () => {
    const { token, email } = await makeInvitation(owner)
    const person = await makeSignedIn(email)
    await expect(asNewPerson(token)).rejects.toBeInstanceOf(ConflictError)
    const row = await Person.unscoped().findByPk(person.id)
    expect(row!.passwordHash).toBe('-')
    expect(await getOffer(person, token)).toMatchObject({ next: 'join' })
  })
})

describe('a link that is not good any more', () => {
  const everyWay = async (token: string) => {
    const person = await makeSignedIn()
    return Promise.all(
      [
        getOffer(null, token),
        getOffer(person, token),
        acceptInvitation(person, { token }),
        asNewPerson(token),
      ].map((one) => one.catch((error: unknown) => error)),
    )
  }
  const expectGone = async (token: string) => {
    for (const answer of await everyWay(token)) expect(answer).toBeInstanceOf(NotFoundError)
  }

  it('is an invented one', () => expectGone('x'.repeat(43)))

  it('is one whose week is over, to the invited person too', async () => {
    const { token, email, invitation } = await makeInvitation(owner)
    await age(invitation, WEEK - 60_000)
    expect((await getOffer(null, token)).kind).toBe('open')
    await invitation.reload()
    await age(invitation, 60_001)
    await expectGone(token)
    const person = await makeSignedIn(email)
    await expect(acceptInvitation(person, { token })).rejects.toBeInstanceOf(NotFoundError)
  })

  it('is one that was withdrawn; withdrawing twice is no error', async () => {
    const { token, invitation } = await makeInvitation(owner)
    await withdrawInvitation(owner, { invitationId: invitation.id })
    await withdrawInvitation(owner, { invitationId: invitation.id })
    await expectGone(token)
    expect(await actionsOf(owner.brandId)).toEqual(['membership.invited', 'membership.withdrawn'])
  })

  it('is the first of two after sending it again, while the second is good for a week anew', async () => {
    const { token, email, invitation } = await makeInvitation(owner)
    await age(invitation, WEEK + 60_000)
    await resendInvitation(owner, { invitationId: invitation.id })
    await expectGone(token)
    const second = await tokenSentTo(email)
    expect(second).not.toBe(token)
    await invitation.reload()
    expect(invitation.expiresAt.getTime()).toBeGreaterThan(Date.now() + WEEK - 60_000)
    await asNewPerson(second)
    expect(await actionsOf(owner.brandId)).toEqual([
      'membership.invited',
      'membership.invitation-resent',
      'membership.joined',
    ])
  })

  it('is one that somebody else has used', async () => {
    const { token } = await makeInvitation(owner)
    await asNewPerson(token)
    await expect(getOffer(null, token)).rejects.toBeInstanceOf(NotFoundError)
    await expect(getOffer(await makeSignedIn(), token)).rejects.toBeInstanceOf(NotFoundError)
  })
})

describe('sending again and withdrawing', () => {
  it('is refused once the invitation is accepted', async () => {
    const { token, invitation } = await makeInvitation(owner)
    await asNewPerson(token)
    const input = { invitationId: invitation.id }
    await expect(resendInvitation(owner, input)).rejects.toBeInstanceOf(ConflictError)
    await expect(withdrawInvitation(owner, input)).rejects.toBeInstanceOf(ConflictError)
  })

  it('again within a minute is refused, so that two presses send one letter', async () => {
    const { email, invitation } = await makeInvitation(owner)
    await age(invitation, 61_000)
    const input = { invitationId: invitation.id }
    const presses = await Promise.allSettled([1, 2].map(() => resendInvitation(owner, input)))
    expect(presses.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect(await lettersTo(email)).toHaveLength(2)
  })

  it('and accepting at the same moment end in one of the two, never both', async () => {
    for (let round = 0; round < 5; round++) {
      const person = await makeSignedIn()
      const { token, invitation } = await makeInvitation(owner, { email: person.email })
      const [accepted, withdrawn] = await Promise.allSettled([
        acceptInvitation(person, { token }),
        withdrawInvitation(owner, { invitationId: invitation.id }),
      ])
      expect([accepted.status, withdrawn.status].sort()).toEqual(['fulfilled', 'rejected'])
      expect(await rolesOf(person.id)).toHaveLength(accepted.status === 'fulfilled' ? 1 : 0)
    }
  })
})
