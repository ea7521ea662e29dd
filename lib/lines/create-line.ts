import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError } from '@/lib/errors'
import { createOnce, inTransaction, Line } from '@/models'

import { canCreateLine } from './policy'
import { LINE_LIMITS } from './constants'
import type { CreateLineInput } from './schema'

/** "Heronsway DK" → "heronsway-dk"; `otherwise` when nothing of it can stand in an address. */
export function slugify(name: string, otherwise = 'line'): string {
  const slug = name
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
  return slug || otherwise
}

/**
 * Makes a line. The same `requestKey` again gives the line it made the first time.
 * @throws ConflictError when the brand has a line of that name
 */
export async function createLine(actor: Actor, input: CreateLineInput): Promise<Line> {
  authorize(actor, canCreateLine)
  const { requestKey, price, ...fields } = input
  return inTransaction(async (transaction) => {
    const { brandId } = actor
    if ((await Line.count({ where: { brandId }, transaction })) >= LINE_LIMITS.perBrand) {
      throw new ConflictError(`A brand holds at most ${LINE_LIMITS.perBrand} lines.`)
    }
    const slug = slugify(input.name)
    const values = { ...fields, brandId, slug, requestKey, priceMinor: Math.round(price * 100) }
    const made = await createOnce(Line, values, transaction)
    if (!made) {
      const message = 'There is a line of that name already.'
      throw new ConflictError(message, { name: [message] })
    }
    const { row, created } = made
    if (created) {
      const after = { ...fields, priceMinor: row.priceMinor }
      await recordActivity(
        actor,
        { action: 'line.created', object: lineObject(row), after },
        transaction,
      )
    }
    return row
  })
}
