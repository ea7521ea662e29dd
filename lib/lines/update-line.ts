import { authorize, type Actor } from '@/lib/auth/actor'
import { inTransaction, Line, updateVersioned } from '@/models'

import { canUpdateLine } from './policy'
import { getLine } from './queries'
import type { UpdateLineInput } from './schema'

/**
 * Changes what a line is; its address stays.
 * @throws NotFoundError, ConflictError when somebody saved in between
 */
export async function updateLine(actor: Actor, input: UpdateLineInput): Promise<Line> {
  authorize(actor, canUpdateLine)
  const { lineSlug, version, price, ...fields } = input
  return inTransaction(async (transaction) => {
    const line = await getLine(actor, lineSlug, transaction)
    await updateVersioned(
      Line,
      { id: line.id, brandId: actor.brandId, version },
      { ...fields, priceMinor: Math.round(price * 100) },
      transaction,
    )
    return line.reload({ transaction })
  })
}
