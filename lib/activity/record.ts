import type { Transaction } from 'sequelize'

import { Activity } from '@/models'
import { currentScope } from '@/models/scope'

/** What was done, to what, and what it was before and after; never a secret. */
export interface ActivityEntry {
  /** The noun and what happened to it: "shade.updated". */
  action: `${string}.${string}`
  object?: { kind: string; id: string; label: string }
  before?: Record<string, unknown>
  after?: Record<string, unknown>
}

/**
 * Adds a line to the brand's activity record, in the transaction of what it tells of: both are
 * there after commit, or neither.
 */
export async function recordActivity(
  { brandId, personId }: { brandId: string; personId: string | null },
  { action, object, before, after }: ActivityEntry,
  transaction: Transaction,
): Promise<void> {
  await Activity.create(
    {
      brandId,
      personId,
      action,
      objectKind: object?.kind ?? null,
      objectId: object?.id ?? null,
      objectLabel: object?.label ?? null,
      before: before ?? null,
      after: after ?? null,
      requestId: currentScope().requestId ?? null,
    },
    { transaction },
  )
}
