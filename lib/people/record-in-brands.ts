import type { Transaction } from 'sequelize'

import { recordActivity, type ActivityEntry } from '@/lib/activity/record'
import { Membership, speakFor } from '@/models'
import { currentScope } from '@/models/scope'

/**
 * Adds a line to the activity record of each of a person's brands, in the transaction of what it
 * tells of. One query a brand.
 */
export async function recordInBrands(
  personId: string,
  entry: ActivityEntry,
  transaction: Transaction,
): Promise<void> {
  await speakFor({ personId }, transaction)
  const memberships = await Membership.findAll({ where: { personId }, transaction })
  for (const { brandId } of memberships) {
    await speakFor({ brandId, personId }, transaction)
    await recordActivity({ brandId, personId }, entry, transaction)
  }
  await speakFor(currentScope(), transaction)
}
