import { authorize, type Actor } from '@/lib/auth/actor'
import { Brand, Membership } from '@/models'

import { canRequireSecondFactor } from './require-second-factor'

/** Whether the brand asks everybody for a second factor, and whom that concerns. */
export interface SecondFactorRequirement {
  required: boolean
  /** The owner who looks at it has one. */
  ownInUse: boolean
  /** The names of those of the brand who have none, in order. */
  without: string[]
}

/** The brand's requirement as its owner sees it. @throws ForbiddenError */
export async function getSecondFactorRequirement(actor: Actor): Promise<SecondFactorRequirement> {
  authorize(actor, canRequireSecondFactor)
  const { brandId, personId } = actor
  const brand = await Brand.findByPk(brandId, { rejectOnEmpty: true })
  const memberships = await Membership.findAll({
    where: { brandId },
    include: [{ association: 'person', attributes: ['name', 'totpConfirmedAt'] }],
    order: [['person', 'name', 'ASC']],
  })
  const without = memberships.filter(({ person }) => !person!.totpConfirmedAt)
  return {
    required: brand.secondFactorRequired,
    ownInUse: !without.some((one) => one.personId === personId),
    without: without.map(({ person }) => person!.name),
  }
}
