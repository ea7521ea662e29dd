import { randomUUID } from 'node:crypto'

import { describe, expect, it } from 'vitest'

import { digest } from '@/lib/auth/seal'
import { sweepPeople } from '@/lib/people/sweep'
import { Invitation, Letter, Session } from '@/models'
import { makeActor, makeBrand } from '@/tests/factories/brand'

const DAY = 24 * 60 * 60_000
const ago = (days: number) => new Date(Date.now() - days * DAY)

describe('the sweep of accounts', () => {
  it('removes invitations a month after their end, and no younger one', async () => {
    const { id: brandId } = await makeBrand()
    const invite = (expiresAt: Date) =>
      Invitation.create({
        brandId,
        email: `${randomUUID()}@people.example`,
        role: 'dyer',
        tokenHash: digest(randomUUID()),
        invitedById: null,
        expiresAt,
      })
    const [old, young] = [await invite(ago(31)), await invite(ago(29))]
    await sweepPeople()
    const left = await Invitation.findAll({ where: { brandId } })
    expect(left.map(({ id }) => id)).toEqual([young.id])
    expect(left).not.toContainEqual(expect.objectContaining({ id: old.id }))
  })

  it('removes sessions that have ended or that nobody has used, and no other', async () => {
    const { personId } = await makeActor(await makeBrand())
    const open = (expiresAt: Date, lastSeenAt: Date) =>
      Session.create({ personId, expiresAt, lastSeenAt })
    await open(ago(1), new Date())
    await open(ago(-1), ago(1))
    const live = await open(ago(-1), new Date())
    await sweepPeople()
    const left = await Session.findAll({ where: { personId } })
    expect(left.map(({ id }) => id)).toEqual([live.id])
  })

  it('forgets a letter a month after it went out, and never one that has not', async () => {
    const recipient = `${randomUUID()}@people.example`
    const letter = (sentAt: Date | null) =>
      Letter.create({ kind: 'test', recipient, subject: '', sealedBody: '', sentAt })
    await letter(ago(31))
    const waiting = await letter(null)
    await waiting.update({ createdAt: ago(90) })
    await sweepPeople()
    const left = await Letter.findAll({ where: { recipient } })
    expect(left.map(({ id }) => id)).toEqual([waiting.id])
  })
})
