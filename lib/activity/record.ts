import type { Transaction } from 'sequelize'

import { Activity } from '@/models'
import { currentScope } from '@/models/scope'

import { changesOf } from './changes-of'
import type { ActivityAction } from './constants'

/** The thing that something happened to, as it was called then. */
export interface ActivityObject {
  kind: string
  id: string
  label: string
}

/** What was done, to what, and what it was before and after; never a secret. */
export interface ActivityEntry {
  action: ActivityAction
  object?: ActivityObject
  before?: Record<string, unknown>
  after?: Record<string, unknown>
}

/** Who did it: an actor, or a person in a brand. */
type Doer = { readonly brandId: string; readonly personId: string | null }

/**
 * Adds a line to the brand's activity record, in the transaction of what it tells of: both are
 * there after commit, or neither.
 */
export async function recordActivity(
  { brandId, personId }: Doer,
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

/** Records an edit with the fields that it changed; one that changed none is not recorded. */
export async function recordChanges(
  doer: Doer,
  entry: Pick<ActivityEntry, 'action' | 'object'>,
  changes: { before: object; after: object },
  transaction: Transaction,
): Promise<void> {
  const changed = changesOf(changes.before, changes.after)
  if (changed) await recordActivity(doer, { ...entry, ...changed }, transaction)
}
