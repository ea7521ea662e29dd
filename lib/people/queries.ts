import { Op } from 'sequelize'

import { SESSION_IDLE, type SignedInPerson } from '@/lib/auth/sessions'
import { Membership, Session } from '@/models'
import { withinScope } from '@/models/scope'

/** The sessions of a person that have not ended, last seen first. */
export function listSessions({ id }: SignedInPerson): Promise<Session[]> {
  const now = Date.now()
  return Session.findAll({
    where: {
      personId: id,
      expiresAt: { [Op.gt]: new Date(now) },
      lastSeenAt: { [Op.gt]: new Date(now - SESSION_IDLE) },
    },
    order: [['lastSeenAt', 'DESC']],
  })
}

/** What becomes of a brand when one of its people closes their account. */
export interface Farewell {
  brandId: string
  brandSlug: string
  brandName: string
  /** It stays as it is; it is removed, having nobody else; or it would be left without an owner. */
  fate: 'stays' | 'removed' | 'ownerless'
}

/** What becomes of each of a person's brands when they close their account. One query a brand. */
export function listFarewells({ id, memberships }: SignedInPerson): Promise<Farewell[]> {
  return Promise.all(
    memberships.map(async ({ brandId, brandSlug, brandName }) => {
      const members = await withinScope({ brandId }, () =>
        Membership.findAll({ where: { brandId } }),
      )
      return { brandId, brandSlug, brandName, fate: fateOf(id, members) }
    }),
  )
}

/** What becomes of a brand with these members when one of them goes. */
export function fateOf(
  personId: string,
  members: readonly Pick<Membership, 'personId' | 'role'>[],
): Farewell['fate'] {
  const others = members.filter((one) => one.personId !== personId)
  if (others.length === 0) return 'removed'
  return others.some(({ role }) => role === 'owner') ? 'stays' : 'ownerless'
}
