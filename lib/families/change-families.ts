import { UniqueConstraintError, type Transaction } from 'sequelize'

import type { ActivityEntry } from '@/lib/activity/record'
import { recordActivity } from '@/lib/activity/record'
import { authorize, type Actor, type Policy } from '@/lib/auth/actor'
import { ConflictError, NotFoundError } from '@/lib/errors'
import { getLine } from '@/lib/lines/queries'
import { inTransaction, type Line } from '@/models'

import {
  withoutEmpty,
  type ArrangedFamily,
  type ArrangedShade,
  type Arrangement,
} from './arrangement'
import { FAMILY_LIMITS } from './constants'
import { readArrangement, saveArrangement } from './save-arrangement'
import type { FormerFamilies } from './schema'

/** What every edit of families answers. */
export interface FamiliesAnswer {
  /** The version to edit from next. */
  version: number
  /** What `restoreFamilies` takes to put everything back; null when nothing was changed. */
  former: FormerFamilies | null
}

/** What an edit makes of the families, and how it is told. */
export interface FamiliesChange {
  after: Arrangement
  entry: ActivityEntry
  /** How many families were asked for, where that changes. */
  count?: number | null
}

const OVERTAKEN =
  'Somebody else changed the families of this line first. Nothing of yours was changed: look at them as they are now, then do it again.'

/**
 * The one way to change the families of a line: authorises, opens the transaction, takes the line's
 * row, refuses an edit of a version that is past, saves what the work makes of them without empty
 * families, raises `familiesVersion` and records it. An edit that changes nothing leaves no trace.
 * @throws ForbiddenError, NotFoundError
 * @throws ConflictError when somebody changed the families in between, or there are too many
 */
export async function changeFamilies(
  actor: Actor,
  policy: Policy,
  { lineSlug, version }: { lineSlug: string; version: number },
  work: (before: Arrangement, line: Line) => FamiliesChange,
): Promise<FamiliesAnswer> {
  authorize(actor, policy)
  try {
    return await inTransaction(async (transaction) => {
      const line = await lockLine(actor, lineSlug, transaction)
      // First of all: what the edit speaks of may have gone by what it has not seen.
      if (line.familiesVersion !== version) throw new ConflictError(OVERTAKEN)
      const before = await readArrangement(line, transaction)
      const { after: wished, entry, count = line.familyCount } = work(before, line)
      const after = withoutEmpty(wished)
      if (after.families.length > FAMILY_LIMITS.perLine) {
        throw new ConflictError(
          `A line has at most ${FAMILY_LIMITS.perLine} families. Nothing was changed.`,
        )
      }
      const former = formerOf(line, before, after)
      const changed = await saveArrangement(line, before, after, transaction)
      if (!changed && count === line.familyCount) return { version, former: null }
      await line.increment('familiesVersion', { transaction })
      if (count !== line.familyCount) await line.update({ familyCount: count }, { transaction })
      await recordActivity(actor, entry, transaction)
      return { version: version + 1, former }
    })
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error
    throw new ConflictError(OVERTAKEN)
  }
}

async function lockLine(actor: Actor, slug: string, transaction: Transaction): Promise<Line> {
  const line = await getLine(actor, slug, transaction)
  // Not FOR UPDATE: a photograph being added holds a key share on the line and need not wait.
  return line.reload({ transaction, lock: transaction.LOCK.NO_KEY_UPDATE })
}

/** What takes the change from one arrangement to the other back. */
function formerOf(line: Line, before: Arrangement, after: Arrangement): FormerFamilies {
  const now = new Map(after.shades.map((shade) => [shade.id, shade]))
  return {
    count: line.familyCount,
    families: before.families.map(({ id, name, nameGiven, neutral }) => ({
      id,
      name,
      nameGiven,
      neutral,
    })),
    shades: before.shades.flatMap(({ id, familyId, pinned, position }) => {
      const is = now.get(id)
      const same = is?.familyId === familyId && is.pinned === pinned && is.position === position
      return same || familyId === null ? [] : [{ id, familyId, pinned, position }]
    }),
  }
}

/** The family of the arrangement with this id. @throws NotFoundError */
export function findFamily({ families }: Arrangement, familyId: string): ArrangedFamily {
  const family = families.find(({ id }) => id === familyId)
  if (!family) throw new NotFoundError()
  return family
}

/** The shades of the arrangement with these ids. @throws NotFoundError when one is missing */
export function findArranged(
  { shades }: Arrangement,
  shadeIds: readonly string[],
): ArrangedShade[] {
  const wanted = new Set(shadeIds)
  const found = shades.filter(({ id }) => wanted.has(id))
  if (found.length !== wanted.size) throw new NotFoundError()
  return found
}
