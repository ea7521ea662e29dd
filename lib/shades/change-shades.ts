import { col, fn, Op, UniqueConstraintError, where, type Transaction } from 'sequelize'

import { authorize, type Actor } from '@/lib/auth/actor'
import { ConflictError, NotFoundError } from '@/lib/errors'
import { placeNewShades } from '@/lib/families/place-new-shades'
import { getLine } from '@/lib/lines/queries'
import { inTransaction, Shade, type Line } from '@/models'

import { canEditShades } from './policy'
import { SHADE_LIMITS } from './constants'

/** What a change did: its answer, and whether any row is different now. */
export interface Change<T> {
  answer: T
  changed: boolean
}

/**
 * The one way to change the shades of a line: authorises, opens the transaction, takes the line's
 * row so that changes to one line happen one after another. When something changed, new shades fall
 * into a family, and `shadesRevision` is raised, so that stored matches are known to be stale.
 * @throws ForbiddenError, NotFoundError
 * @throws ConflictError when the database finds a number taken
 */
export async function changeShades<T>(
  actor: Actor,
  lineSlug: string,
  work: (line: Line, transaction: Transaction) => Promise<Change<T>>,
): Promise<T> {
  authorize(actor, canEditShades)
  try {
    return await inTransaction(async (transaction) => {
      const line = await getLine(actor, lineSlug, transaction)
      // Not FOR UPDATE: a photograph being added holds a key share on the line and need not wait.
      await line.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE })
      const { answer, changed } = await work(line, transaction)
      if (changed) {
        await placeNewShades(line, transaction)
        await line.increment('shadesRevision', { transaction })
      }
      return answer
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    throw new ConflictError(
      'A number is in use by another shade of this line already. Nothing was changed.',
    )
  }
}

/**
 * The shades of a line with these ids, deleted ones among them.
 * @throws NotFoundError when one of them is not a shade of this line
 */
export async function findShades(
  line: Line,
  shadeIds: readonly string[],
  transaction: Transaction,
): Promise<Shade[]> {
  const ids = [...new Set(shadeIds)]
  const shades = await Shade.findAll({
    where: { brandId: line.brandId, lineId: line.id, id: ids },
    paranoid: false,
    transaction,
  })
  if (shades.length !== ids.length) throw new NotFoundError()
  return shades
}

/** The shade of the line, deleted ones left out, that has one of these numbers in any case. */
export async function findNumberHolder(
  line: Line,
  numbers: readonly string[],
  transaction: Transaction,
  exceptId?: string,
): Promise<Shade | null> {
  if (numbers.length === 0) return null
  return Shade.findOne({
    where: {
      brandId: line.brandId,
      lineId: line.id,
      // PostgreSQL lowers both, so that they are lowered alike.
      [Op.and]: where(fn('lower', col('number')), {
        [Op.in]: numbers.map((number) => fn('lower', number)),
      }),
      ...(exceptId && { id: { [Op.ne]: exceptId } }),
    },
    transaction,
  })
}

/** The conflict that says who has the number. */
export function numberTaken(holder: Pick<Shade, 'number' | 'name'>): ConflictError {
  const by = holder.name ? ` by ${holder.name}` : ''
  const message = `No. ${holder.number} is taken${by}. Choose another number.`
  return new ConflictError(message, { number: [message] })
}

/** @throws ConflictError when the line cannot take so many more shades */
export function requireRoom(held: number, more: number): void {
  if (held + more <= SHADE_LIMITS.perLine) return
  const most = SHADE_LIMITS.perLine.toLocaleString('en-GB')
  throw new ConflictError(
    `A line holds at most ${most} shades; this one has ${held.toLocaleString('en-GB')}. Nothing was changed.`,
  )
}
