import { lineObject } from '@/lib/activity/objects'
import { recordChanges } from '@/lib/activity/record'
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
    const values = { ...fields, priceMinor: Math.round(price * 100) }
    const { id, brandId } = line
    await updateVersioned(Line, { id, brandId, version }, values, transaction)
    await recordChanges(
      actor,
      { action: 'line.updated', object: lineObject(line) },
      { before: line, after: values },
      transaction,
    )
    return line.reload({ transaction })
  })
}
